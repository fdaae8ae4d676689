"use client";

import { RowGroup } from "@/components/forms/form-grid";
import { findSection } from "@/lib/catalog/find-section";
import { DraftChoice, DraftQuantity, DraftRows, DraftSteel, useDraftForm } from "./draft-form";
import { isDraftObject, textAt, valueAt, type DraftObject } from "./node-draft";
import { anySide, hasCleats, SIDE_WORDS, SideRow, type SideName } from "./side-cells";
import { startWebCleats } from "./side-edits";

const hasWebCleats = (side: SideName, draft: DraftObject): boolean =>
  hasCleats(side, draft) && isDraftObject(valueAt(draft, `${side}.connection.webCleats`));

type Has = (side: SideName, draft: DraftObject) => boolean;

interface GroupProps {
  /** Where the fields lie below the connection: "cleat", "webCleats". */
  readonly at: string;
  /** What they belong to, in a field's name. */
  readonly words: string;
  readonly when: Has;
}

/** Angle, steel and length of a cleat. */
function AngleRows({ at, words, when }: GroupProps) {
  const { catalog } = useDraftForm();
  const angles = catalog.angles.map(({ designation }) => ({ value: designation, label: designation }));
  return (
    <>
      <SideRow label="Angle" when={when}>
        {(side) => (
          <DraftChoice
            path={`${side}.connection.${at}.section`}
            label={`${SIDE_WORDS[side]} ${words} angle`}
            choices={angles}
          />
        )}
      </SideRow>
      <SideRow label="Steel" when={when}>
        {(side) => (
          <DraftSteel path={`${side}.connection.${at}.steel`} label={`${SIDE_WORDS[side]} ${words} steel`} />
        )}
      </SideRow>
      <SideRow label="Length" unit="mm" when={when}>
        {(side) => (
          <DraftQuantity
            path={`${side}.connection.${at}.length`}
            label={`${SIDE_WORDS[side]} ${words} length`}
            unit="mm"
          />
        )}
      </SideRow>
    </>
  );
}

/** Size and class of bolts. */
function BoltKindRows({ at, words, when }: GroupProps) {
  const { catalog } = useDraftForm();
  const sizes = catalog.fasteners.map(({ size }) => ({ value: size, label: size }));
  const grades = catalog.fastenerGrades.map(({ name }) => ({ value: name, label: name }));
  return (
    <>
      <SideRow label="Size" when={when}>
        {(side) => (
          <DraftChoice
            path={`${side}.connection.${at}.size`}
            label={`${SIDE_WORDS[side]} ${words} size`}
            choices={sizes}
          />
        )}
      </SideRow>
      <SideRow label="Class" when={when}>
        {(side) => (
          <DraftChoice
            path={`${side}.connection.${at}.grade`}
            label={`${SIDE_WORDS[side]} ${words} class`}
            choices={grades}
          />
        )}
      </SideRow>
    </>
  );
}

function HeelRows({ at, words, when }: GroupProps) {
  return (
    <SideRow label="Rows" unit="mm" hint="From the heel of the angle." when={when}>
      {(side, hintId) => (
        <DraftRows
          path={`${side}.connection.${at}.rows`}
          label={`${SIDE_WORDS[side]} ${words}`}
          hintId={hintId}
        />
      )}
    </SideRow>
  );
}

interface QuantityRowProps extends GroupProps {
  readonly label: string;
  readonly hint?: string;
  readonly placeholder?: string;
}

/** One length of the connection, in mm. */
function QuantityRow({ at, words, when, label, hint, placeholder }: QuantityRowProps) {
  return (
    <SideRow label={label} unit="mm" when={when} {...(hint ? { hint } : {})}>
      {(side, hintId) => (
        <DraftQuantity
          path={`${side}.connection.${at}`}
          label={`${SIDE_WORDS[side]} ${words}`}
          unit="mm"
          hintId={hintId}
          {...(placeholder ? { placeholder } : {})}
        />
      )}
    </SideRow>
  );
}

/** Adds web cleats to a side, or leaves them out again. */
function WebCleatsSwitch({ side }: { readonly side: SideName }) {
  const { draft, catalog, readOnly, set } = useDraftForm();
  const isThere = hasWebCleats(side, draft);
  if (readOnly) return <p className="py-1">{isThere ? "yes" : "none"}</p>;
  const section = valueAt(draft, `${side}.beam.section`);
  const depthMm =
    (typeof section === "string" ? findSection(catalog, section)?.depthMm : Number(valueAt(section, "h"))) ||
    300;
  const steel = valueAt(draft, `${side}.connection.cleat.steel`) ?? "S355";
  return (
    <button
      type="button"
      aria-label={`${isThere ? "Leave out" : "Add"} the ${side} web cleats`}
      onClick={() =>
        set(`${side}.connection.webCleats`, isThere ? undefined : startWebCleats(steel, depthMm))
      }
      className="py-1 text-note text-petrol hover:underline"
    >
      {isThere ? "Leave out" : "+ add"}
    </button>
  );
}

function WebCleatRows() {
  const { draft } = useDraftForm();
  const both = [
    {
      at: "webCleats.bolts",
      words: "web cleat bolts in the column",
      title: "Web cleats, bolts in the column",
    },
    {
      at: "webCleats.beamBolts",
      words: "web cleat bolts in the beam",
      title: "Web cleats, bolts in the beam",
    },
  ];
  return (
    <>
      <RowGroup title="Web cleats">
        <SideRow label="On the beam’s web" when={hasCleats}>
          {(side) => <WebCleatsSwitch side={side} />}
        </SideRow>
        {anySide(draft, hasWebCleats) ? (
          <AngleRows at="webCleats" words="web cleat" when={hasWebCleats} />
        ) : null}
      </RowGroup>
      {anySide(draft, hasWebCleats)
        ? both.map(({ title, ...bolts }) => (
            <RowGroup key={title} title={title}>
              <BoltKindRows {...bolts} when={hasWebCleats} />
              <HeelRows {...bolts} when={hasWebCleats} />
            </RowGroup>
          ))
        : null}
    </>
  );
}

/** Top and seat angles of the sides that have them: angles, bolts of both legs, gap, web cleats. */
export function CleatFields() {
  const { draft } = useDraftForm();
  const isUnequal = anySide(draft, (side, now) =>
    /^L (\d+)x(?!\1x)/.test(textAt(now, `${side}.connection.cleat.section`)),
  );
  const inColumn = { words: "cleat bolts in the column", when: hasCleats };
  const inBeam = { words: "cleat bolts in the beam", when: hasCleats };
  return (
    <>
      <p className="border-t border-rule py-2 text-note text-soft">
        Cleats are drawn and kept; the calculation answers “outside scope” for them.
        {isUnequal ? " An unequal angle lies with its longer leg where a bolt is farther from the heel." : ""}
      </p>
      <RowGroup title="Flange cleats">
        <AngleRows at="cleat" words="cleat" when={hasCleats} />
        <QuantityRow
          at="stiffened.thickness"
          words="rib of the cleats, thickness"
          when={hasCleats}
          label="Rib, thickness"
          hint="Between the legs of the angle. Empty: no rib."
          placeholder="none"
        />
        <QuantityRow
          at="gap"
          words="gap before the beam"
          when={hasCleats}
          label="Gap"
          hint="From the column’s face to the end of the beam."
        />
      </RowGroup>
      <RowGroup title="Cleat bolts in the column">
        <BoltKindRows at="bolts" {...inColumn} />
        <QuantityRow
          at="bolts.distance"
          words="cleat bolts in the column, from the heel"
          when={hasCleats}
          label="From the heel"
        />
        <QuantityRow
          at="bolts.gauge"
          words="cleat bolts in the column, gauge"
          when={hasCleats}
          label="Gauge"
        />
      </RowGroup>
      <RowGroup title="Cleat bolts in the beam">
        <BoltKindRows at="beamBolts" {...inBeam} />
        <HeelRows at="beamBolts" {...inBeam} />
        <QuantityRow
          at="beamBolts.gauge"
          words="cleat bolts in the beam, gauge"
          when={hasCleats}
          label="Gauge"
        />
      </RowGroup>
      <WebCleatRows />
    </>
  );
}
