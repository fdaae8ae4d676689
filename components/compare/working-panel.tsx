"use client";
import type {
  ComponentDocument,
  EvaluatedOptionDocument,
  JointDocument,
  OptionDocument,
} from "@/lib/schemas/result-document";
import { BillOfOperations } from "@/components/cost/bill-of-operations";
import { StepTree } from "@/components/trace/step-tree";
import { Dialog } from "@/components/ui/dialog";
import { formatMinutes, formatNumber } from "@/components/ui/format-number";
import { Failed, Loading } from "@/components/ui/states";
import { componentLabel, sentenceCase } from "./component-labels";
import { isEvaluated, type LoadCaseChoice, type Opening } from "./comparison-cells";
import { checksOf, whereWords } from "./comparison-rows";
import { measureFacts, measureName } from "./measure-words";
import { MomentRotation } from "./moment-rotation";
import { UtilisationFigure } from "./utilisation-bar";

/** Where the working of one option stands: it is fetched when it is first asked for. */
export type Working =
  | { readonly state: "loading" }
  | { readonly state: "failed"; readonly error: unknown; readonly retry: () => void }
  | { readonly state: "ready"; readonly option: OptionDocument; readonly caution: string | null };

export interface WorkingPanelProps {
  readonly option: OptionDocument;
  readonly letter: string;
  readonly opening: Opening;
  readonly choice: LoadCaseChoice;
  readonly limit: number;
  readonly working: Working;
  readonly onClose: () => void;
}

const UNIT_DECIMALS: Readonly<Record<ComponentDocument["unit"], number>> = { kN: 1, kNm: 1, mm: 1, ratio: 3 };

/** One check, worst first; its working opens below it. */
function CheckItem({
  check,
  limit,
  isOpen,
}: {
  readonly check: ComponentDocument;
  readonly limit: number;
  readonly isOpen: boolean;
}) {
  const decimals = UNIT_DECIMALS[check.unit];
  const unit = check.unit === "ratio" ? "" : ` ${check.unit}`;
  return (
    <li className="border-t border-rule py-2 first:border-t-0">
      <details open={isOpen}>
        <summary className="flex flex-wrap items-baseline justify-between gap-x-4 marker:content-none">
          <span>
            <span aria-hidden="true" className="fold-mark mr-1.5 inline-block w-2.5 text-petrol" />
            {sentenceCase(whereWords(check, { kind: "envelope" }))}
          </span>
          <span>
            {`${formatNumber(check.demand, decimals)} / ${formatNumber(check.resistance, decimals)}${unit} = `}
            <UtilisationFigure value={check.utilisation} limit={limit} />
          </span>
        </summary>
        <p className="mt-1 mb-2 text-note text-soft">
          {`${check.clause}. Demand ${formatNumber(check.demand, decimals)}${unit}, resistance ${formatNumber(check.resistance, decimals)}${unit}.`}
          {check.stiffnessCoefficient === undefined
            ? ""
            : ` Stiffness coefficient ${formatNumber(check.stiffnessCoefficient, 2)} mm.`}
        </p>
        {check.steps && check.steps.length > 0 ? <StepTree steps={check.steps} openDepth={2} /> : null}
      </details>
    </li>
  );
}

/** What the standard says of the joint's rotation, in words. */
function rotationWords({ rotationCapacity }: JointDocument): string {
  if (rotationCapacity === undefined) return "";
  if (rotationCapacity === "enough") return "; rotation capacity enough for plastic analysis (6.4)";
  if (rotationCapacity === "not-shown") return "; rotation capacity not shown by 6.4";
  return `; rotates at least ${formatNumber(1000 * rotationCapacity.atLeast, 1)} mrad (6.4)`;
}

const rigidWords = ({ rigidFrom }: JointDocument): string =>
  rigidFrom === undefined
    ? ""
    : rigidFrom === null
      ? "; no joint of this beam can be rigid in this frame"
      : `; rigid from ${formatNumber(rigidFrom)} kNm/rad`;

interface JointItemProps {
  readonly joint: JointDocument;
  readonly momentKnm: number | undefined;
  readonly isOpen: boolean;
}

function JointItem({ joint, momentKnm, isOpen }: JointItemProps) {
  return (
    <li className="border-t border-rule py-2 first:border-t-0">
      <details open={isOpen}>
        <summary className="flex flex-wrap items-baseline justify-between gap-x-4 marker:content-none">
          <span>
            <span aria-hidden="true" className="fold-mark mr-1.5 inline-block w-2.5 text-petrol" />
            {`${sentenceCase(joint.side)}, ${joint.loadCase}`}
          </span>
          <span>{`${formatNumber(joint.momentResistance, 1)} kNm, ${formatNumber(joint.initialStiffness)} kNm/rad`}</span>
        </summary>
        <p className="mt-1 mb-2 text-note text-soft">
          {`${joint.stiffnessClass}, ${joint.strengthClass.replace("-", " ")}; lever arm ${formatNumber(joint.leverArm, 1)} mm; `}
          {joint.secantStiffness === null
            ? "no secant stiffness, the moment is above the resistance"
            : `secant stiffness ${formatNumber(joint.secantStiffness)} kNm/rad`}
          {joint.rows.length > 0
            ? `; rows ${joint.rows.map(({ row, force }) => `${row}: ${formatNumber(force, 1)} kN`).join(", ")}`
            : ""}
          {rigidWords(joint)}
          {rotationWords(joint)}.
        </p>
        {isOpen ? <MomentRotation joint={joint} momentKnm={momentKnm} /> : null}
        {joint.steps && joint.steps.length > 0 ? <StepTree steps={joint.steps} openDepth={2} /> : null}
      </details>
    </li>
  );
}

/** M_Ed of a joint in its load case, from its own check. */
const momentOf = (option: EvaluatedOptionDocument, joint: JointDocument): number | undefined =>
  option.components.find(
    (check) =>
      check.component === "joint-moment" &&
      check.unit === "kNm" &&
      check.side === joint.side &&
      check.loadCase === joint.loadCase,
  )?.demand;

function StepsSection({
  opening,
  choice,
  limit,
  working,
}: Pick<WorkingPanelProps, "opening" | "choice" | "limit" | "working">) {
  if (working.state === "loading") return <Loading what="the working" />;
  if (working.state === "failed")
    return <Failed title="The working could not be read." error={working.error} onRetry={working.retry} />;
  if (!isEvaluated(working.option)) return <p>{working.option.outsideScope.reason}</p>;
  const { option } = working;
  return (
    <>
      {working.caution ? <p className="mb-3 border-l-4 border-tight pl-3">{working.caution}</p> : null}
      {opening.about === "component" ? (
        <ol>
          {checksOf(option, choice, opening.component).map((check, index) => (
            <CheckItem key={index} check={check} limit={limit} isOpen={index === 0} />
          ))}
        </ol>
      ) : (
        <ol>
          {[...option.joints]
            .filter((joint) => choice.kind === "envelope" || joint.loadCase === choice.name)
            .sort((a, b) => a.initialStiffness - b.initialStiffness)
            .map((joint, index) => (
              <JointItem
                key={`${joint.side}-${joint.loadCase}`}
                joint={joint}
                momentKnm={momentOf(option, joint)}
                isOpen={index === 0}
              />
            ))}
        </ol>
      )}
    </>
  );
}

function HoursSection({
  option,
  trade,
}: {
  readonly option: EvaluatedOptionDocument;
  readonly trade?: string | undefined;
}) {
  const { estimate } = option;
  return (
    <>
      <p className="mb-3">{`Shop ${formatMinutes(estimate.shopMinutes)}, site ${formatMinutes(estimate.siteMinutes)}, a node. Minutes below are those of the people on it.`}</p>
      <BillOfOperations estimate={estimate} {...(trade === undefined ? {} : { only: { trade } })} />
    </>
  );
}

function OptionSection({ option }: { readonly option: OptionDocument }) {
  const cautions = isEvaluated(option)
    ? [option.connectionFailure, option.sizing, ...option.cautions].filter((words) => words !== null)
    : [option.outsideScope.reason];
  return (
    <div className="grid gap-5">
      {option.measures.length === 0 ? <p>Nothing is added to the column.</p> : null}
      {option.measures.map((measure, index) => (
        <section key={index}>
          <h3>{measureName(measure)}</h3>
          <dl className="mt-1 grid grid-cols-[auto_1fr] gap-x-4 gap-y-0.5">
            {measureFacts(measure).map(([label, value]) => (
              <div key={label} className="contents">
                <dt className="text-soft">{label}</dt>
                <dd>{value}</dd>
              </div>
            ))}
          </dl>
        </section>
      ))}
      {cautions.length > 0 ? (
        <section>
          <h3>{isEvaluated(option) ? "To mind" : "Outside scope"}</h3>
          <ul className="mt-1 grid list-disc gap-1 pl-4">
            {cautions.map((words) => (
              <li key={words}>{words}</li>
            ))}
          </ul>
        </section>
      ) : null}
    </div>
  );
}

function titleOf(opening: Opening): string {
  switch (opening.about) {
    case "component":
      return sentenceCase(componentLabel(opening.component));
    case "joint":
      return "Stiffness and resistance";
    case "hours":
      return opening.trade === undefined
        ? "Hours added"
        : `Hours added, ${opening.trade.replaceAll("-", " ")}`;
    case "cost":
      return opening.category === undefined ? "Cost added" : `Cost added, ${opening.category}`;
    case "option":
      return "Parts of the option";
  }
}

function PanelBody(props: WorkingPanelProps) {
  const { option, opening } = props;
  if (opening.about === "option" || !isEvaluated(option)) return <OptionSection option={option} />;
  if (opening.about === "cost") {
    return (
      <BillOfOperations
        estimate={option.estimate}
        {...(opening.category === undefined ? {} : { only: { category: opening.category } })}
      />
    );
  }
  if (opening.about === "hours") return <HoursSection option={option} trade={opening.trade} />;
  return <StepsSection {...props} />;
}

/** The side panel that a number opens: its working, the bill of operations, or the parts of the option. */
export function WorkingPanel(props: WorkingPanelProps) {
  return (
    <Dialog
      shape="panel"
      onClose={props.onClose}
      title={
        <>
          <span className="mb-1 block text-label font-[450] tracking-normal text-soft">{`${props.letter} ${props.option.name}`}</span>{" "}
          {titleOf(props.opening)}
        </>
      }
    >
      <PanelBody {...props} />
    </Dialog>
  );
}
