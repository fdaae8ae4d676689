import { isDraftObject, type DraftObject, type DraftValue } from "./node-draft";

/** What was typed and not saved yet, with the version it was typed on. */
export interface KeptDraft {
  readonly draft: DraftObject;
  readonly openedVersion: number;
  readonly opened: DraftObject;
}

const keyOf = (nodeId: string): string => `panelwright.node-draft.${nodeId}`;

/** Keeps the draft for this browser tab. A full or forbidden store is no reason to stop typing. */
export function keepDraft(nodeId: string, kept: KeptDraft): void {
  try {
    window.sessionStorage.setItem(keyOf(nodeId), JSON.stringify(kept));
  } catch {
    // The draft is still in the page; only a reload would lose it.
  }
}

/** Forgets the draft: it was saved, or dropped. */
export function forgetDraft(nodeId: string): void {
  try {
    window.sessionStorage.removeItem(keyOf(nodeId));
  } catch {
    // Nothing was kept.
  }
}

/** The draft kept for a node in this tab, or null. */
export function keptDraft(nodeId: string): KeptDraft | null {
  try {
    const text = window.sessionStorage.getItem(keyOf(nodeId));
    const kept = text === null ? null : (JSON.parse(text) as DraftValue);
    if (!isDraftObject(kept ?? undefined)) return null;
    const { draft, openedVersion, opened } = kept as DraftObject;
    return isDraftObject(draft) && isDraftObject(opened) && typeof openedVersion === "number"
      ? { draft, openedVersion, opened }
      : null;
  } catch {
    return null;
  }
}
