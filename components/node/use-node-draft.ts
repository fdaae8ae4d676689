"use client";

import { useCallback, useEffect, useMemo, useRef, useState } from "react";
import type { Catalog } from "@/lib/catalog/catalog";
import type { NodeCase } from "@/lib/calc/node";
import { forgetDraft, keepDraft, keptDraft } from "./draft-store";
import { sameDraft, withValue, type DraftObject, type DraftValue } from "./node-draft";
import { readDraft, type DraftReading } from "./read-draft";

export interface OpenedNode {
  readonly version: number;
  readonly draft: DraftObject;
}

export interface NodeDraft {
  readonly draft: DraftObject;
  readonly opened: OpenedNode;
  readonly reading: DraftReading;
  /** The node as last drawable, so that the drawing stands while a size is half typed. */
  readonly drawn: NodeCase | null;
  readonly isChanged: boolean;
  /** True when what is shown was typed before a reload. */
  readonly isRestored: boolean;
  /** Messages of the server by path, until the next change. */
  readonly refused: ReadonlyMap<string, string>;
  readonly set: (path: string, value: DraftValue | undefined) => void;
  readonly edit: (change: (draft: DraftObject) => DraftObject) => void;
  /** Takes the last change back; null when there is none. */
  readonly undo: (() => void) | null;
  /** Starts again from a saved version. `onTop` says what stays typed on top of it, given what is typed now. */
  readonly open: (opened: OpenedNode, onTop?: (now: DraftObject) => DraftObject) => void;
  readonly refuse: (errors: readonly { readonly path: string; readonly message: string }[]) => void;
}

/** A draft as it was before a change, and the field that the change was typed into. */
interface Before {
  readonly draft: DraftObject;
  readonly path: string | null;
}

interface State {
  /** The latest last. */
  readonly before: readonly Before[];
  readonly draft: DraftObject;
  readonly opened: OpenedNode;
  readonly isRestored: boolean;
}

/** How many changes can be taken back. */
const KEPT_CHANGES = 60;

const NOTHING_REFUSED: ReadonlyMap<string, string> = new Map();

function startOf(storeKey: string, saved: OpenedNode, mayEdit: boolean): State {
  const kept = mayEdit ? keptDraft(storeKey) : null;
  if (kept === null || sameDraft(kept.draft, saved.draft))
    return { before: [], draft: saved.draft, opened: saved, isRestored: false };
  return {
    before: [],
    draft: kept.draft,
    opened: { version: kept.openedVersion, draft: kept.opened },
    isRestored: true,
  };
}

/** One change: text typed on into one field counts as one. */
function changed(state: State, change: (draft: DraftObject) => DraftObject, path: string | null): State {
  const draft = change(state.draft);
  if (draft === state.draft) return state;
  const continues = path !== null && state.before.at(-1)?.path === path;
  const before = continues
    ? state.before
    : [...state.before, { draft: state.draft, path }].slice(-KEPT_CHANGES);
  return { ...state, draft, before };
}

function takenBack(state: State): State {
  const last = state.before.at(-1);
  return last ? { ...state, draft: last.draft, before: state.before.slice(0, -1) } : state;
}

/**
 * The draft of one node: what is typed, what it was opened from, and what is wrong with it. It is kept
 * for the browser tab until it is saved.
 *
 * @param storeKey - the node's id, or one for a new node of a project.
 */
export function useNodeDraft(
  storeKey: string,
  saved: OpenedNode,
  catalog: Catalog,
  mayEdit: boolean,
): NodeDraft {
  const [state, setState] = useState<State>(() => startOf(storeKey, saved, mayEdit));
  const [refused, setRefused] = useState(NOTHING_REFUSED);
  const { draft, opened, isRestored } = state;
  const reading = useMemo(() => readDraft(draft, catalog), [draft, catalog]);
  const isChanged = useMemo(() => !sameDraft(draft, opened.draft), [draft, opened.draft]);

  const [drawn, setDrawn] = useState(reading.drawable);
  if (reading.drawable !== null && reading.drawable !== drawn) setDrawn(reading.drawable);

  const wasKept = useRef(false);
  useEffect(() => {
    if (!mayEdit) return;
    if (isChanged) keepDraft(storeKey, { draft, opened: opened.draft, openedVersion: opened.version });
    else if (wasKept.current) forgetDraft(storeKey);
    wasKept.current = isChanged;
  }, [storeKey, draft, opened, isChanged, mayEdit]);

  const edit = useCallback((change: (draft: DraftObject) => DraftObject) => {
    setRefused(NOTHING_REFUSED);
    setState((now) => changed(now, change, null));
  }, []);
  const set = useCallback((path: string, value: DraftValue | undefined) => {
    setRefused(NOTHING_REFUSED);
    setState((now) => changed(now, (draft) => withValue(draft, path, value), path));
  }, []);
  const undo = useCallback(() => setState(takenBack), []);
  const open = useCallback((next: OpenedNode, onTop?: (now: DraftObject) => DraftObject) => {
    setRefused(NOTHING_REFUSED);
    setState((now) => ({
      before: [],
      opened: next,
      draft: onTop?.(now.draft) ?? next.draft,
      isRestored: false,
    }));
  }, []);
  const refuse = useCallback(
    (errors: readonly { readonly path: string; readonly message: string }[]) =>
      setRefused(new Map(errors.map(({ path, message }) => [path, message]))),
    [],
  );
  return {
    draft,
    opened,
    reading,
    drawn,
    isChanged,
    isRestored,
    refused,
    set,
    edit,
    undo: state.before.length > 0 ? undo : null,
    open,
    refuse,
  };
}
