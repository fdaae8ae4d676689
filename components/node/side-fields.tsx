"use client";

import { useState } from "react";
import { FormRow, FormSection, RowGroup } from "@/components/forms/form-grid";
import { findSection } from "@/lib/catalog/find-section";
import { DraftQuantity, DraftSection, DraftSteel, DraftWeld, useDraftForm } from "./draft-form";
import { isDraftObject, valueAt, type DraftObject } from "./node-draft";
import {
  anySide,
  Both,
  hasCleats,
  hasWelds,
  isEndPlate,
  kindOf,
  SIDE_WORDS,
  SideRow,
  type SideName,
} from "./side-cells";
import { BoltRows } from "./bolt-fields";
import { CleatFields } from "./cleat-fields";
import { withConnectionKind, withoutSide, withSideCopied } from "./side-edits";

const SMALL = "text-note font-normal text-petrol hover:underline";

/** Head of one side's column: its name, and what may be done with the whole side. */
function SideHead({ side }: { readonly side: SideName }) {
  const { draft, readOnly, edit } = useDraftForm();
  const other: SideName = side === "left" ? "right" : "left";
  const isThere = isDraftObject(draft[side]);
  const otherIsThere = isDraftObject(draft[other]);
  return (
    <div>
      <p className="font-[650]">{SIDE_WORDS[side]}</p>
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

const KINDS = [
  { value: "end-plate", label: "bolted end plate" },
  { value: "welded", label: "welded" },
  { value: "flange-cleats", label: "flange cleats" },
] as const;

/** The kind of connection; another kind starts from sizes that fit the beam. */
function ConnectionKind({ side }: { readonly side: SideName }) {
  const { draft, catalog, readOnly, edit, errorAt } = useDraftForm();
  const kind = kindOf(side, draft);
  const section = valueAt(draft, `${side}.beam.section`);
  const row = typeof section === "string" ? findSection(catalog, section) : null;
  const sizeOf = (key: string, catalogued: number | undefined): number =>
    catalogued ?? (Number(valueAt(section, key)) || 300);
  const label = `${SIDE_WORDS[side]} connection`;
  if (readOnly) return <p className="py-1">{KINDS.find((choice) => choice.value === kind)?.label ?? kind}</p>;
  return (
    <div>
      <select
        aria-label={label}
        data-path={`${side}.connection.kind`}
        value={kind}
        onChange={(event) => {
          const chosen = KINDS.find(({ value }) => value === event.target.value)?.value;
          if (chosen) {
            edit((now) =>
              withConnectionKind(now, side, chosen, sizeOf("h", row?.depthMm), sizeOf("b", row?.widthMm)),
            );
          }
        }}
        className="control min-h-8 w-full min-w-0 py-0.5"
      >
        {KINDS.map((choice) => (
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
            {(side) => (
              <DraftSection path={`${side}.beam.section`} label={`${SIDE_WORDS[side]} beam section`} />
            )}
          </Both>
        )}
      </FormRow>
      <FormRow label="Steel">
        {() => (
          <Both>
            {(side) => <DraftSteel path={`${side}.beam.steel`} label={`${SIDE_WORDS[side]} beam steel`} />}
          </Both>
        )}
      </FormRow>
      <FormRow label="Span" unit="mm" hint="Between column axes; decides the stiffness class.">
        {(hintId) => (
          <Both>
            {(side) => (
              <DraftQuantity
                path={`${side}.beam.span`}
                label={`${SIDE_WORDS[side]} beam span`}
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
              <DraftSteel
                path={`${side}.connection.plate.steel`}
                label={`${SIDE_WORDS[side]} end plate steel`}
              />
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
                  label={`${SIDE_WORDS[side]} ${words}`}
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

const RIB_ROWS = [
  ["top.thickness", "Above, thickness", "rib above the beam, thickness"],
  ["top.length", "Above, length", "rib above the beam, length"],
  ["bottom.thickness", "Below, thickness", "rib below the beam, thickness"],
  ["bottom.length", "Below, length", "rib below the beam, length"],
] as const;
const hasRibs = (side: SideName, draft: DraftObject): boolean =>
  isEndPlate(side, draft) && isDraftObject(valueAt(draft, `${side}.connection.plate.stiffener`));

/** Ribs between the beam's flange and the plate past it. Few nodes have them, so their rows come when asked for. */
function RibRows() {
  const { draft, readOnly } = useDraftForm();
  const [isAsked, setAsked] = useState(false);
  if (!isAsked && !anySide(draft, hasRibs)) {
    return readOnly ? null : (
      <button type="button" className={`${SMALL} py-1`} onClick={() => setAsked(true)}>
        + ribs on the plate past the beam
      </button>
    );
  }
  return (
    <RowGroup title="Ribs past the beam">
      {RIB_ROWS.map(([key, label, words], index) => (
        <SideRow
          key={key}
          label={label}
          unit="mm"
          when={isEndPlate}
          {...(index === 0 ? { hint: "Length along the beam. Empty: no rib." } : {})}
        >
          {(side, hintId) => (
            <DraftQuantity
              path={`${side}.connection.plate.stiffener.${key}`}
              label={`${SIDE_WORDS[side]} ${words}`}
              unit="mm"
              placeholder="none"
              hintId={hintId}
            />
          )}
        </SideRow>
      ))}
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
                  label={`${SIDE_WORDS[side]} ${words}`}
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
      {anySide(draft, hasCleats) ? <CleatFields /> : null}
      {anySide(draft, isEndPlate) ? (
        <>
          <PlateRows />
          <RibRows />
          <BoltRows />
        </>
      ) : null}
      {anySide(draft, hasWelds) ? <WeldRows /> : null}
    </FormSection>
  );
}
