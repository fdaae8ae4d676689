"use client";

import { ChoiceField, type Choice } from "@/components/forms/choice-field";
import { FormRow, FormSection, RowGroup } from "@/components/forms/form-grid";
import { DraftChoice, DraftQuantity, DraftSection, DraftSteel, DraftText, useDraftForm } from "./draft-form";
import { isDraftObject, shownText, valueAt } from "./node-draft";

/** Name and number of the node. */
export function NodeFacts() {
  return (
    <FormSection title="Node">
      <FormRow label="Reference" isWide hint="Grid line, level or mark on the drawings.">
        {(hintId) => <DraftText path="reference" label="Reference" hintId={hintId} />}
      </FormRow>
      <FormRow
        label="Number of nodes"
        hint="Alike in the project: set-ups and drawing are shared among them."
      >
        {(hintId) => <DraftQuantity path="quantity" label="Number of nodes" unit="" hintId={hintId} />}
      </FormRow>
    </FormSection>
  );
}

/** The column and where it ends. */
export function ColumnFields() {
  return (
    <FormSection title="Column">
      <FormRow label="Section" isWide>
        {() => <DraftSection path="column.section" label="Column section" />}
      </FormRow>
      <FormRow label="Steel" hint="Strength follows the thickness of each part.">
        {(hintId) => <DraftSteel path="column.steel" label="Column steel" hintId={hintId} />}
      </FormRow>
      <FormRow
        label="End above"
        unit="mm"
        hint="From the upper beam's top face to the column's end. Empty: the column goes on."
      >
        {(hintId) => (
          <DraftQuantity
            path="column.endDistanceAbove"
            label="Column end above"
            unit="mm"
            placeholder="goes on"
            hintId={hintId}
          />
        )}
      </FormRow>
      <FormRow
        label="End below"
        unit="mm"
        hint="From the lower beam's bottom face. Empty: the column goes on."
      >
        {(hintId) => (
          <DraftQuantity
            path="column.endDistanceBelow"
            label="Column end below"
            unit="mm"
            placeholder="goes on"
            hintId={hintId}
          />
        )}
      </FormRow>
      <FormRow label="Storey height" unit="mm">
        {() => <DraftQuantity path="column.storeyHeight" label="Storey height" unit="mm" />}
      </FormRow>
    </FormSection>
  );
}

const BRACING = [
  { value: "unbraced", label: "unbraced" },
  { value: "braced", label: "braced" },
];

function StiffnessTarget() {
  const { draft, readOnly, set } = useDraftForm();
  const stiffness = valueAt(draft, "target.stiffness");
  const isWord = stiffness === "any" || stiffness === "rigid";
  return (
    <div className="grid gap-1">
      <DraftTargetKind
        kind={isWord ? stiffness : "given"}
        onChange={(kind) => set("target.stiffness", kind === "given" ? "50000" : kind)}
        readOnly={readOnly}
      />
      {isWord ? null : <DraftQuantity path="target.stiffness" label="Stiffness to reach" unit="kNm/rad" />}
    </div>
  );
}

const TARGETS = [
  { value: "any", label: "any stiffness" },
  { value: "rigid", label: "every joint rigid" },
  { value: "given", label: "at least, kNm/rad" },
];

function DraftTargetKind({
  kind,
  onChange,
  readOnly,
}: {
  readonly kind: string;
  readonly onChange: (kind: string) => void;
  readonly readOnly: boolean;
}) {
  if (readOnly) return <p className="py-1">{TARGETS.find((target) => target.value === kind)?.label}</p>;
  return (
    <select
      aria-label="Stiffness target"
      value={kind}
      onChange={(event) => onChange(event.target.value)}
      className="control min-h-8 w-full min-w-0 py-0.5"
    >
      {TARGETS.map((target) => (
        <option key={target.value} value={target.value}>
          {target.label}
        </option>
      ))}
    </select>
  );
}

/** The frame around the node, what is to be reached, and the factors of the design. */
export function TargetFields() {
  return (
    <FormSection title="Frame and target">
      <FormRow
        label="Frame"
        hint="Sway cut by at least 80 % counts as braced; decides from which stiffness a joint is rigid."
      >
        {(hintId) => (
          <DraftChoice path="frame.bracing" label="Frame bracing" choices={BRACING} hintId={hintId} />
        )}
      </FormRow>
      <FormRow label="Utilisation, at most">
        {() => <DraftQuantity path="target.utilisation" label="Utilisation, at most" unit="" />}
      </FormRow>
      <FormRow label="Initial stiffness">{() => <StiffnessTarget />}</FormRow>
    </FormSection>
  );
}

interface Reading {
  readonly path: string;
  readonly label: string;
  /** For a screen reader, which hears no heading above. */
  readonly fullLabel: string;
  readonly hint: string;
  /** The usual one first, which is not written down. */
  readonly choices: readonly Choice[];
}

const READINGS: readonly Reading[] = [
  {
    path: "choices.strengths",
    label: "Strengths",
    fullLabel: "Strengths of grades",
    hint: "Of grades by name, at the thickness of each part.",
    choices: [
      { value: "", label: "product standard" },
      { value: "en1993-1-1-table-3.1", label: "EN 1993-1-1, Table 3.1" },
    ],
  },
  {
    path: "choices.tStubModeOne",
    label: "T-stub, mode 1",
    fullLabel: "T-stub method in mode 1",
    hint: "EN 1993-1-8, Table 6.2: with (2) or without (1) the washer’s width.",
    choices: [
      { value: "", label: "method 2" },
      { value: "method-1", label: "method 1" },
    ],
  },
  {
    path: "choices.triangularLimit",
    label: "Straight line of rows",
    fullLabel: "Straight line of bolt rows",
    hint: "EN 1993-1-8, 6.2.7.2(9): below a row close to the failure of its bolts; the United Kingdom lifts it for thin plates and flanges.",
    choices: [
      { value: "", label: "always" },
      { value: "united-kingdom", label: "as in the United Kingdom" },
    ],
  },
  {
    path: "choices.flangeWelds",
    label: "Flange welds",
    fullLabel: "Method for flange welds",
    hint: "EN 1993-1-8, 4.5.3.2 or 4.5.3.3.",
    choices: [
      { value: "", label: "directional method" },
      { value: "simplified", label: "simplified method" },
    ],
  },
];

/** Which reading is taken where the standard leaves a choice; nothing is written down where it is the usual one. */
function ReadingRows() {
  return (
    <RowGroup title="Reading of the standard">
      {READINGS.map(({ path, label, fullLabel, hint, choices }) => (
        <FormRow key={path} label={label} hint={hint}>
          {(hintId) => <DraftChoice path={path} label={fullLabel} choices={choices} hintId={hintId} />}
        </FormRow>
      ))}
    </RowGroup>
  );
}

/** Factors of EN 1993-1-8 as published, and of national annexes; the annex in force comes first. */
const FACTOR_SETS = [
  { value: "recommended", label: "recommended", factors: ["1.0", "1.0", "1.25"] },
  { value: "germany", label: "Germany (from memory)", factors: ["1.0", "1.1", "1.25"] },
] as const;
const FACTOR_NAMES = ["gammaM0", "gammaM1", "gammaM2"] as const;

/** Fills the three factors at once. The United Kingdom and others keep the recommended values (from memory). */
function FactorSet() {
  const { draft, readOnly, edit, onFocus } = useDraftForm();
  const typed = FACTOR_NAMES.map((name) => Number(shownText(valueAt(draft, `partialFactors.${name}`))));
  const found = FACTOR_SETS.find(({ factors }) =>
    factors.every((factor, index) => Number(factor) === typed[index]),
  );
  return (
    <FormRow label="Set of factors" hint="Fills the three below; your national annex decides.">
      {(hintId) => (
        <ChoiceField
          label="Set of partial factors"
          path="partialFactors"
          hintId={hintId}
          value={found?.value ?? "own"}
          choices={[...FACTOR_SETS, ...(found ? [] : [{ value: "own", label: "as typed below" }])]}
          readOnly={readOnly}
          onFocus={() => onFocus("partialFactors")}
          onChange={(value) => {
            const chosen = FACTOR_SETS.find((set) => set.value === value);
            if (!chosen) return;
            const partialFactors = Object.fromEntries(
              FACTOR_NAMES.map((name, index) => [name, chosen.factors[index] ?? ""]),
            );
            edit((now) => ({ ...now, partialFactors }));
          }}
        />
      )}
    </FormRow>
  );
}

/** Partial factors of the national annex, and the reading of the standard. */
export function FactorFields() {
  return (
    <FormSection title="Partial factors">
      <FactorSet />
      {FACTOR_NAMES.map((name) => (
        <FormRow
          key={name}
          label={
            <>
              γ<sub>M{name.slice(-1)}</sub>
            </>
          }
        >
          {() => (
            <DraftQuantity
              path={`partialFactors.${name}`}
              label={`Partial factor gamma M${name.slice(-1)}`}
              unit=""
            />
          )}
        </FormRow>
      ))}
      <ReadingRows />
    </FormSection>
  );
}

const CLASSES = ["1", "2", "3", "4"].map((value) => ({ value, label: `EXC${value}` }));
const COATINGS = [
  { value: "none", label: "none" },
  { value: "paint", label: "paint" },
  { value: "galvanised", label: "galvanised" },
];
const FIRST_FABRICATION = { liftLength: "7200", nodesPerLift: "2", executionClass: "2", coating: "paint" };

/** How the column is made and lifted; may be left out. */
export function FabricationFields() {
  const { draft, readOnly, set } = useDraftForm();
  const isGiven = isDraftObject(draft.fabrication);
  return (
    <FormSection
      title="Fabrication"
      note={isGiven ? undefined : "Left out: the shop's usual values are taken."}
    >
      {isGiven ? (
        <>
          <FormRow
            label="Column lift"
            unit="mm"
            hint="From splice to splice: a heavier column changes all of it."
          >
            {(hintId) => (
              <DraftQuantity
                path="fabrication.liftLength"
                label="Column lift length"
                unit="mm"
                hintId={hintId}
              />
            )}
          </FormRow>
          <FormRow label="Nodes a lift" hint="They share the cost of a heavier column.">
            {(hintId) => (
              <DraftQuantity path="fabrication.nodesPerLift" label="Nodes a lift" unit="" hintId={hintId} />
            )}
          </FormRow>
          <FormRow label="Execution class">
            {() => (
              <DraftChoice path="fabrication.executionClass" label="Execution class" choices={CLASSES} />
            )}
          </FormRow>
          <FormRow label="Coating">
            {() => <DraftChoice path="fabrication.coating" label="Coating" choices={COATINGS} />}
          </FormRow>
        </>
      ) : null}
      {readOnly ? null : (
        <button
          type="button"
          onClick={() => set("fabrication", isGiven ? undefined : FIRST_FABRICATION)}
          className="py-1 text-note text-petrol hover:underline"
        >
          {isGiven ? "Leave fabrication out" : "+ state lift, class and coating"}
        </button>
      )}
    </FormSection>
  );
}
