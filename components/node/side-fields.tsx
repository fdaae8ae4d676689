"use client";

import type { ReactNode } from "react";
import { FormRow, FormSection, RowGroup } from "@/components/forms/form-grid";
import { findSection } from "@/lib/catalog/find-section";
import {
  DraftCheck,
  DraftChoice,
  DraftQuantity,
  DraftRows,
  DraftSection,
  DraftSteel,
  DraftWeld,
  useDraftForm,
} from "./draft-form";
import { isDraftObject, valueAt, type DraftObject } from "./node-draft";
import { withConnectionKind, withoutSide, withSideCopied } from "./side-edits";

type SideName = "left" | "right";
const SIDES = ["left", "right"] as const;
const Words: Readonly<Record<SideName, string>> = { left: "Left", right: "Right" };
const SMALL = "text-note font-normal text-petrol hover:underline";

/** Head of one side's column: its name, and what may be done with the whole side. */
function SideHead({ side }: { readonly side: SideName }) {
  const { draft, readOnly, edit } = useDraftForm();
  const other: SideName = side === "left" ? "right" : "left";
  const isThere = isDraftObject(draft[side]);
  const otherIsThere = isDraftObject(draft[other]);
  return (
    <div>
      <p className="font-[650]">{Words[side]}</p>
      {readOnly ? null : (
        <p className="flex flex-wrap gap-x-3">
          {otherIsThere ? (
            <button type="button" className={SMALL} onClick={() => edit((now) => withSideCopied(now, side))}>
              {isThere ? `Copy from ${other}` : `Add, as on the ${other}`}
            </button>
          ) : null}
          {isThere && otherIsThere ? (
            <button
              type="button"
              className={SMALL}
              aria-label={`Remove the ${side} beam`}
              onClick={() => edit((now) => withoutSide(now, side))}
            >
              Remove
            </button>
          ) : null}
        </p>
      )}
    </div>
  );
}

interface BothProps {
  /** Whether a side has this field; a side without it leaves its cell empty. */
  readonly when?: (side: SideName, draft: DraftObject) => boolean;
  readonly children: (side: SideName) => ReactNode;
}

/** The cells of a row, one a side. */
function Both({ when, children }: BothProps) {
  const { draft } = useDraftForm();
  return SIDES.map((side) =>
    isDraftObject(draft[side]) && (when?.(side, draft) ?? true) ? (
      <div key={side}>{children(side)}</div>
    ) : (
      <span key={side} aria-hidden="true" />
    ),
  );
}

const kindOf = (side: SideName, draft: DraftObject): string =>
  String(valueAt(draft, `${side}.connection.kind`) ?? "");
const isEndPlate = (side: SideName, draft: DraftObject): boolean => kindOf(side, draft) === "end-plate";
const hasWelds = (side: SideName, draft: DraftObject): boolean => kindOf(side, draft) !== "flange-cleats";
const anySide = (draft: DraftObject, test: (side: SideName, draft: DraftObject) => boolean): boolean =>
  SIDES.some((side) => isDraftObject(draft[side]) && test(side, draft));

const KINDS = [
  { value: "end-plate", label: "bolted end plate" },
  { value: "welded", label: "welded" },
];
const CLEATS = { value: "flange-cleats", label: "flange cleats" };

/** The kind of connection. Cleats come with a document and are kept; they have no fields here yet. */
function ConnectionKind({ side }: { readonly side: SideName }) {
  const { draft, catalog, readOnly, edit, errorAt } = useDraftForm();
  const kind = kindOf(side, draft);
  const section = valueAt(draft, `${side}.beam.section`);
  const row = typeof section === "string" ? findSection(catalog, section) : null;
  const sizeOf = (key: string, catalogued: number | undefined): number =>
    catalogued ?? (Number(valueAt(section, key)) || 300);
  const choices = kind === "flange-cleats" ? [...KINDS, CLEATS] : KINDS;
  const label = `${Words[side]} connection`;
  if (readOnly)
    return <p className="py-1">{choices.find((choice) => choice.value === kind)?.label ?? kind}</p>;
  return (
    <div>
      <select
        aria-label={label}
        data-path={`${side}.connection.kind`}
        value={kind}
        onChange={(event) => {
          const chosen = event.target.value;
          if (chosen === "end-plate" || chosen === "welded") {
            edit((now) =>
              withConnectionKind(now, side, chosen, sizeOf("h", row?.depthMm), sizeOf("b", row?.widthMm)),
            );
          }
        }}
        className="control min-h-8 w-full min-w-0 py-0.5"
      >
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value}>
            {choice.label}
          </option>
        ))}
      </select>
      {errorAt(`${side}.connection.kind`) ? (
        <p role="alert" className="text-note text-fail">
          {errorAt(`${side}.connection.kind`)}
        </p>
      ) : null}
    </div>
  );
}

function BeamRows() {
  const { draft } = useDraftForm();
  const bothThere = isDraftObject(draft.left) && isDraftObject(draft.right);
  return (
    <RowGroup title="Beam">
      <FormRow label="Section">
        {() => (
          <Both>
            {(side) => <DraftSection path={`${side}.beam.section`} label={`${Words[side]} beam section`} />}
          </Both>
        )}
      </FormRow>
      <FormRow label="Steel">
        {() => (
          <Both>
            {(side) => <DraftSteel path={`${side}.beam.steel`} label={`${Words[side]} beam steel`} />}
          </Both>
        )}
      </FormRow>
      <FormRow label="Span" unit="mm" hint="Between column axes; decides the stiffness class.">
        {(hintId) => (
          <Both>
            {(side) => (
              <DraftQuantity
                path={`${side}.beam.span`}
                label={`${Words[side]} beam span`}
                unit="mm"
                hintId={hintId}
              />
            )}
          </Both>
        )}
      </FormRow>
      {bothThere ? (
        <FormRow label="Step" unit="mm" hint="How far the right beam's top lies below the left beam's.">
          {(hintId) => (
            <Both when={(side) => side === "right"}>
              {() => (
                <DraftQuantity
                  path="right.levelOffset"
                  label="Right beam below the left"
                  unit="mm"
                  placeholder="0"
                  hintId={hintId}
                />
              )}
            </Both>
          )}
        </FormRow>
      ) : null}
    </RowGroup>
  );
}

const PLATE_ROWS = [
  ["thickness", "Thickness", "end plate thickness"],
  ["width", "Width", "end plate width"],
  ["extensionTop", "Past the beam's top", "end plate past the beam's top"],
  ["extensionBottom", "Past its bottom", "end plate past the beam's bottom"],
] as const;

function PlateRows() {
  return (
    <RowGroup title="End plate">
      <FormRow label="Steel">
        {() => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftSteel path={`${side}.connection.plate.steel`} label={`${Words[side]} end plate steel`} />
            )}
          </Both>
        )}
      </FormRow>
      {PLATE_ROWS.map(([key, label, words]) => (
        <FormRow key={key} label={label} unit="mm">
          {() => (
            <Both when={isEndPlate}>
              {(side) => (
                <DraftQuantity
                  path={`${side}.connection.plate.${key}`}
                  label={`${Words[side]} ${words}`}
                  unit="mm"
                />
              )}
            </Both>
          )}
        </FormRow>
      ))}
    </RowGroup>
  );
}

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

/** Two bolts a row where nothing is said. */
function PerRow({ side }: { readonly side: SideName }) {
  const { draft, set, readOnly } = useDraftForm();
  const path = `${side}.connection.bolts.perRow`;
  if (valueAt(draft, path) !== undefined)
    return <DraftChoice path={path} label={`${Words[side]} bolts a row`} choices={PER_ROW} />;
  if (readOnly) return <p className="py-1">2</p>;
  return (
    <select
      aria-label={`${Words[side]} bolts a row`}
      data-path={path}
      value="2"
      onChange={(event) => set(path, event.target.value)}
      className="control min-h-8 w-full min-w-0 py-0.5"
    >
      <option value="2">2</option>
      <option value="4">4</option>
    </select>
  );
}

function BoltRows() {
  const { catalog, draft } = useDraftForm();
  const sizes = catalog.fasteners.map(({ size }) => ({ value: size, label: size }));
  const grades = catalog.fastenerGrades.map(({ name }) => ({ value: name, label: name }));
  const hasFour = (side: SideName, now: DraftObject): boolean =>
    isEndPlate(side, now) && String(valueAt(now, `${side}.connection.bolts.perRow`)) === "4";
  const cell = (side: SideName, key: string): { path: string } => ({
    path: `${side}.connection.bolts.${key}`,
  });
  return (
    <RowGroup title="Bolts">
      <FormRow label="Size">
        {() => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftChoice {...cell(side, "size")} label={`${Words[side]} bolt size`} choices={sizes} />
            )}
          </Both>
        )}
      </FormRow>
      <FormRow label="Class">
        {() => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftChoice {...cell(side, "grade")} label={`${Words[side]} bolt class`} choices={grades} />
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
            {(side) => <DraftRows {...cell(side, "rows")} label={`${Words[side]} bolts`} hintId={hintId} />}
          </Both>
        )}
      </FormRow>
      <FormRow label="Gauge" unit="mm" hint="Between the two inner bolts of a row.">
        {(hintId) => (
          <Both when={isEndPlate}>
            {(side) => (
              <DraftQuantity
                {...cell(side, "gauge")}
                label={`${Words[side]} bolt gauge`}
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
        <FormRow label="Outer gauge" unit="mm">
          {() => (
            <Both when={hasFour}>
              {(side) => (
                <DraftQuantity
                  {...cell(side, "outerGauge")}
                  label={`${Words[side]} outer bolt gauge`}
                  unit="mm"
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
                label={`${Words[side]} bolts preloaded`}
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
                label={`${Words[side]} bolt assembly`}
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

function WeldRows() {
  const rows = [
    ["topFlange", "Top flange", "top flange weld"],
    ["bottomFlange", "Bottom flange", "bottom flange weld"],
    ["web", "Web", "web weld"],
  ] as const;
  return (
    <RowGroup title="Beam welds">
      {rows.map(([key, label, words], index) => (
        <FormRow
          key={key}
          label={label}
          unit="mm"
          {...(index === 0 ? { hint: "Throat of a fillet, or a full butt weld." } : {})}
        >
          {(hintId) => (
            <Both when={hasWelds}>
              {(side) => (
                <DraftWeld
                  path={`${side}.connection.welds.${key}`}
                  label={`${Words[side]} ${words}`}
                  hintId={hintId}
                />
              )}
            </Both>
          )}
        </FormRow>
      ))}
    </RowGroup>
  );
}

/** Beams and connections, left and right side by side as on a schedule. */
export function SideFields() {
  const { draft, errorAt } = useDraftForm();
  const hasCleats = anySide(draft, (side, now) => kindOf(side, now) === "flange-cleats");
  const missing = errorAt("left") ?? errorAt("right");
  return (
    <FormSection
      title="Beams and connections"
      columns={2}
      heads={[<SideHead key="left" side="left" />, <SideHead key="right" side="right" />]}
    >
      {missing ? (
        <p role="alert" className="py-1 font-semibold text-fail">
          <span aria-hidden="true">▲ </span>
          {missing}
        </p>
      ) : null}
      <BeamRows />
      <RowGroup title="Connection">
        <FormRow label="Kind">{() => <Both>{(side) => <ConnectionKind side={side} />}</Both>}</FormRow>
      </RowGroup>
      {hasCleats ? (
        <p className="border-t border-rule py-2 text-note text-soft">
          Cleats are kept as they came; change them in the node as JSON.
        </p>
      ) : null}
      {anySide(draft, isEndPlate) ? (
        <>
          <PlateRows />
          <BoltRows />
        </>
      ) : null}
      {anySide(draft, hasWelds) ? <WeldRows /> : null}
    </FormSection>
  );
}
