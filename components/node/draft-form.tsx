"use client";

import { createContext, useContext } from "react";
import type { Catalog } from "@/lib/catalog/catalog";
import { CellField, ReadValue } from "@/components/forms/cell-field";
import { ChoiceField, type Choice } from "@/components/forms/choice-field";
import { GradePicker, type TypedSteel } from "@/components/forms/grade-picker";
import { QuantityField } from "@/components/forms/quantity-field";
import { RowsField } from "@/components/forms/rows-field";
import { SectionPicker, type TypedSection } from "@/components/forms/section-picker";
import { WeldField } from "@/components/forms/weld-field";
import {
  isDraftList,
  isDraftObject,
  shownText,
  valueAt,
  type DraftObject,
  type DraftValue,
} from "./node-draft";

/** What every field of the node form shares. */
export interface DraftForm {
  readonly draft: DraftObject;
  readonly catalog: Catalog;
  readonly readOnly: boolean;
  readonly set: (path: string, value: DraftValue | undefined) => void;
  readonly edit: (change: (draft: DraftObject) => DraftObject) => void;
  readonly errorAt: (path: string) => string | undefined;
  /** Tells the drawing which field has the focus. */
  readonly onFocus: (path: string) => void;
}

const Context = createContext<DraftForm | null>(null);
export const DraftFormProvider = Context.Provider;

/** The form that a field stands in. @throws Error outside of one. */
export function useDraftForm(): DraftForm {
  const form = useContext(Context);
  if (form === null) throw new Error("This field needs a node form around it.");
  return form;
}

interface FieldProps {
  readonly path: string;
  readonly label: string;
  readonly hintId?: string | undefined;
}

/** What is the same for every bound field. */
function useField({ path, label, hintId }: FieldProps) {
  const form = useDraftForm();
  const shared = { path, label, hintId, readOnly: form.readOnly, onFocus: () => form.onFocus(path) };
  return { form, value: valueAt(form.draft, path), shared };
}

/** A number of the document. An empty field that may be left out is left out. */
export function DraftQuantity({
  unit,
  placeholder,
  ...field
}: FieldProps & { readonly unit: string; readonly placeholder?: string }) {
  const { form, value, shared } = useField(field);
  return (
    <QuantityField
      {...shared}
      unit={unit}
      value={shownText(value)}
      onChange={(text) => form.set(field.path, text)}
      error={form.errorAt(field.path)}
      {...(placeholder === undefined ? {} : { placeholder })}
    />
  );
}

/** One of a few words of the document, or a small number such as bolts a row. */
export function DraftChoice({ choices, ...field }: FieldProps & { readonly choices: readonly Choice[] }) {
  const { form, value, shared } = useField(field);
  return (
    <ChoiceField
      {...shared}
      value={shownText(value)}
      choices={choices}
      onChange={(chosen) => form.set(field.path, chosen)}
      error={form.errorAt(field.path)}
    />
  );
}

export function DraftWeld(field: FieldProps) {
  const { form, value, shared } = useField(field);
  return (
    <WeldField
      {...shared}
      value={shownText(value)}
      onChange={(typed) => form.set(field.path, typed)}
      error={form.errorAt(field.path)}
    />
  );
}

const typedGroup = (value: DraftValue | undefined): string | Record<string, string> =>
  isDraftObject(value)
    ? Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, shownText(inner)]))
    : shownText(value);

export function DraftSteel(field: FieldProps) {
  const { form, value, shared } = useField(field);
  return (
    <GradePicker
      {...shared}
      catalog={form.catalog}
      value={typedGroup(value)}
      errorAt={form.errorAt}
      onChange={(typed: TypedSteel) => form.set(field.path, typed)}
    />
  );
}

export function DraftSection(field: FieldProps) {
  const { form, value, shared } = useField(field);
  return (
    <SectionPicker
      {...shared}
      catalog={form.catalog}
      value={typedGroup(value)}
      errorAt={form.errorAt}
      onFocus={form.onFocus}
      onChange={(typed: TypedSection) => form.set(field.path, typed)}
    />
  );
}

export function DraftRows(field: FieldProps) {
  const { form, value, shared } = useField(field);
  return (
    <RowsField
      {...shared}
      rows={isDraftList(value) ? value.map(shownText) : []}
      errorAt={form.errorAt}
      onFocus={form.onFocus}
      onChange={(rows) => form.set(field.path, rows)}
    />
  );
}

/** A yes or no that may be left out. */
export function DraftCheck({ words, ...field }: FieldProps & { readonly words: string }) {
  const { form, value, shared } = useField(field);
  if (form.readOnly) return <p className="py-1">{value === true ? "yes" : "no"}</p>;
  return (
    <label className="inline-flex min-h-8 items-center gap-2">
      <input
        type="checkbox"
        className="size-4 accent-petrol"
        aria-label={shared.label}
        data-path={field.path}
        checked={value === true}
        onFocus={shared.onFocus}
        onChange={(event) => form.set(field.path, event.target.checked ? true : undefined)}
      />
      <span aria-hidden="true">{words}</span>
    </label>
  );
}

/** A line of words. */
export function DraftText(field: FieldProps) {
  const { form, value, shared } = useField(field);
  if (form.readOnly) {
    return (
      <ReadValue label={field.label} path={field.path}>
        {shownText(value)}
      </ReadValue>
    );
  }
  return (
    <CellField label={field.label} path={field.path} error={form.errorAt(field.path)} hintId={field.hintId}>
      {(binding) => (
        <input
          {...binding}
          type="text"
          autoComplete="off"
          value={shownText(value)}
          onFocus={shared.onFocus}
          onChange={(event) => form.set(field.path, event.target.value)}
          className="control min-h-8 w-full py-0.5"
        />
      )}
    </CellField>
  );
}
