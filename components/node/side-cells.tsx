"use client";

import type { ReactNode } from "react";
import { FormRow } from "@/components/forms/form-grid";
import { useDraftForm } from "./draft-form";
import { isDraftObject, textAt, type DraftObject } from "./node-draft";

export type SideName = "left" | "right";
export const SIDES = ["left", "right"] as const;
/** A side at the start of a field's name. */
export const SIDE_WORDS: Readonly<Record<SideName, string>> = { left: "Left", right: "Right" };

export interface BothProps {
  /** Whether a side has this field; a side without it leaves its cell empty. */
  readonly when?: (side: SideName, draft: DraftObject) => boolean;
  readonly children: (side: SideName) => ReactNode;
}

/** The cells of a row, one a side. */
export function Both({ when, children }: BothProps) {
  const { draft } = useDraftForm();
  return SIDES.map((side) =>
    isDraftObject(draft[side]) && (when?.(side, draft) ?? true) ? (
      <div key={side}>{children(side)}</div>
    ) : (
      <span key={side} aria-hidden="true" />
    ),
  );
}

export interface SideRowProps {
  readonly label: string;
  readonly unit?: string;
  readonly hint?: string;
  readonly when: (side: SideName, draft: DraftObject) => boolean;
  readonly children: (side: SideName, hintId: string | undefined) => ReactNode;
}

/** A row of the form with one field a side. */
export const SideRow = ({ when, children, ...row }: SideRowProps) => (
  <FormRow {...row}>{(hintId) => <Both when={when}>{(side) => children(side, hintId)}</Both>}</FormRow>
);

/** The kind of a side's connection, or nothing. */
export const kindOf = (side: SideName, draft: DraftObject): string =>
  textAt(draft, `${side}.connection.kind`);
export const isEndPlate = (side: SideName, draft: DraftObject): boolean =>
  kindOf(side, draft) === "end-plate";
export const hasWelds = (side: SideName, draft: DraftObject): boolean => !hasCleats(side, draft);
export const hasCleats = (side: SideName, draft: DraftObject): boolean =>
  kindOf(side, draft) === "flange-cleats";
/** Whether a test holds on any side that has a beam. */
export const anySide = (draft: DraftObject, test: (side: SideName, draft: DraftObject) => boolean): boolean =>
  SIDES.some((side) => isDraftObject(draft[side]) && test(side, draft));
