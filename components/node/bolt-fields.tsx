"use client";

import { ChoiceField } from "@/components/forms/choice-field";
import { FormRow, RowGroup } from "@/components/forms/form-grid";
import { DraftCheck, DraftChoice, DraftQuantity, DraftRows, useDraftForm } from "./draft-form";
import { textAt, type DraftObject } from "./node-draft";
import { anySide, Both, isEndPlate, SIDE_WORDS, type SideName } from "./side-cells";
import { withBoltsPerRow } from "./side-edits";

const PER_ROW = [
  { value: "2", label: "2" },
  { value: "4", label: "4" },
];
const ASSEMBLIES = [
  { value: "", label: "not stated" },
  { value: "plain", label: "plain" },
  { value: "HR", label: "HR" },
  { value: "HV", label: "HV" },
];

/** Two bolts a row where nothing is said; with four comes the gauge of the outer ones. */
function PerRow({ side }: { readonly side: SideName }) {
  const { draft, edit, readOnly, errorAt, onFocus } = useDraftForm();
  const path = `${side}.connection.bolts.perRow`;
  return (
    <ChoiceField
      label={`${SIDE_WORDS[side]} bolts a row`}
      path={path}
      value={textAt(draft, path) || "2"}
      choices={PER_ROW}
      readOnly={readOnly}
      error={errorAt(path)}
      onFocus={() => onFocus(path)}
      onChange={(chosen) => edit((now) => withBoltsPerRow(now, side, chosen === "4" ? "4" : "2"))}
    />
  );
}

/** Size, class, rows and tightening of the bolts, left and right. */
export function BoltRows() {
  const { catalog, draft } = useDraftForm();
  const sizes = catalog.fasteners.map(({ size }) => ({ value: size, label: size }));
  const grades = catalog.fastenerGrades.map(({ name }) => ({ value: name, label: name }));
  const hasFour = (side: SideName, now: DraftObject): boolean =>
    isEndPlate(side, now) && textAt(now, `${side}.connection.bolts.perRow`) === "4";
  const cell = (side: SideName, key: string): { path: string } => ({
    path: `${side}.connection.bolts.${key}`,
  });
  return (
    <RowGroup title="Bolts">
      <FormRow label="Size">
        {() => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftChoice {...cell(side, "size")} label={`${SIDE_WORDS[side]} bolt size`} choices={sizes} />
            )}
          </Both>
        )}
      </FormRow>
      <FormRow label="Class">
        {() => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftChoice
                {...cell(side, "grade")}
                label={`${SIDE_WORDS[side]} bolt class`}
                choices={grades}
              />
            )}
          </Both>
        )}
      </FormRow>
      <FormRow
        label="Rows"
        unit="mm"
        hint="Each row's distance below the top face of the beam, negative above it, from the top down."
      >
        {(hintId) => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftRows {...cell(side, "rows")} label={`${SIDE_WORDS[side]} bolts`} hintId={hintId} />
            )}
          </Both>
        )}
      </FormRow>
      <FormRow label="Gauge" unit="mm" hint="Between the two inner bolts of a row.">
        {(hintId) => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftQuantity
                {...cell(side, "gauge")}
                label={`${SIDE_WORDS[side]} bolt gauge`}
                unit="mm"
                hintId={hintId}
              />
            )}
          </Both>
        )}
      </FormRow>
      <FormRow label="Bolts a row">
        {() => <Both when={isEndPlate}>{(side) => <PerRow side={side} />}</Both>}
      </FormRow>
      {anySide(draft, hasFour) ? (
        <FormRow label="Outer gauge" unit="mm" hint="Between the two outer bolts of a row.">
          {(hintId) => (
            <Both when={hasFour}>
              {(side) => (
                <DraftQuantity
                  {...cell(side, "outerGauge")}
                  label={`${SIDE_WORDS[side]} outer bolt gauge`}
                  unit="mm"
                  hintId={hintId}
                />
              )}
            </Both>
          )}
        </FormRow>
      ) : null}
      <FormRow label="Tightening">
        {() => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftCheck
                {...cell(side, "preloaded")}
                label={`${SIDE_WORDS[side]} bolts preloaded`}
                words="preloaded"
              />
            )}
          </Both>
        )}
      </FormRow>
      <FormRow label="Assembly" hint="EN 14399 assembly of preloaded bolts.">
        {(hintId) => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftChoice
                {...cell(side, "assembly")}
                label={`${SIDE_WORDS[side]} bolt assembly`}
                choices={ASSEMBLIES}
                hintId={hintId}
              />
            )}
          </Both>
        )}
      </FormRow>
    </RowGroup>
  );
}
