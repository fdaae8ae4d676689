import { epsilonOf, rolledShearAreaMm2, weldedShearAreaMm2 } from "../clauses/en1993-1-1-2005/members";
import {
  enlargedShearAreaMm2,
  panelFrameShearN,
  panelShearN,
  stiffenedPanelShearN,
} from "../clauses/en1993-1-8-2005/column-web";
import { tStubMomentNmm } from "../clauses/en1993-1-8-2005/t-stub";
import { isOnePanel } from "../mechanics/panel-levels";
import { sectionProperties, type SectionProperties } from "../mechanics/section-properties";
import type { PanelDesign, TransverseStiffeners } from "../measures/panel-design";
import type { ISection, JointCase, NodeCase, Side, Steel } from "../node";
import type { Trace } from "../trace/trace";
import { traced, type Traced } from "../trace/traced";

/** The column panel's own numbers, the same in every load case. */
export interface ColumnPanel {
  readonly section: ISection;
  readonly steel: Steel;
  readonly properties: SectionProperties;
  readonly epsilon: number;
  /** With a web plate as enlarged by 6.2.6.1(6). */
  readonly shearArea: Traced;
  /** V_wp,Rd on each side: the frame of flanges and stiffeners is that of the side's own beam. */
  readonly shear: Readonly<Record<Side, Traced>>;
  /** Thickness that a web plate puts between web and stiffeners; 0 without one. */
  readonly webPlateMm: number;
  /** Web and plates together, as though they were one: nothing stiffer can be there. */
  readonly stiffestWebMm: number;
  /** 1.5 or 2 times the web under web plates, 6.2.6.2(6). */
  readonly compressionWebMm: number;
  /** 1.4 or 1.3 (fillet), 1.5 or 2 (butt) times the web under web plates, 6.2.6.3(7). */
  readonly tensionWebMm: number;
}

const shearAreaOf = (trace: Trace | null, section: ISection, areaMm2: number): number =>
  section.make === "rolled"
    ? rolledShearAreaMm2(trace, {
        areaMm2,
        widthMm: section.widthMm,
        flangeThicknessMm: section.flangeThicknessMm,
        webThicknessMm: section.webThicknessMm,
        rootMm: section.rootMm,
        depthMm: section.depthMm,
      })
    : weldedShearAreaMm2(trace, {
        depthMm: section.depthMm,
        flangeThicknessMm: section.flangeThicknessMm,
        webThicknessMm: section.webThicknessMm,
      });

/** Thickness of web that counts in tension with web plates, 6.2.6.3(7), Eq. (6.17) and (6.18). */
function tensionWebMm(design: PanelDesign): number {
  const web = design.column.section.webThicknessMm;
  const plates = design.webPlates;
  if (!plates) return web;
  if (plates.weld.kind === "butt") return (plates.sides === 1 ? 1.5 : 2) * web;
  if (plates.weld.throatMm < plates.thicknessMm / Math.SQRT2 - 1e-9) return web;
  return (design.column.steel.yieldMpa <= 355 ? 1.4 : 1.3) * web;
}

/** Tells which of two pairs yields first in bending about its own plane; steels may differ. */
const bendingRank = ({ widthMm, thicknessMm, steel }: TransverseStiffeners): number =>
  widthMm * thicknessMm ** 2 * steel.yieldMpa;

function shearResistance(
  trace: Trace | null,
  node: NodeCase,
  design: PanelDesign,
  panel: {
    readonly shearAreaMm2: number;
    readonly webDepthMm: number;
    readonly epsilon: number;
  },
  joint: JointCase | undefined,
): number {
  const { section, steel } = design.column;
  const { gammaM0 } = node.partialFactors;
  const mark = trace?.mark();
  const plain = panelShearN(
    trace,
    {
      shearAreaMm2: panel.shearAreaMm2,
      yieldMpa: steel.yieldMpa,
      webDepthMm: panel.webDepthMm,
      webThicknessMm: section.webThicknessMm,
      epsilon: panel.epsilon,
      gammaM0,
    },
    0,
  );
  if (!joint) return plain;
  const { top, bottom } = design.stiffeners[joint.side];
  if (!top || !bottom || top.length !== "full" || bottom.length !== "full") return plain;
  const frameMark = trace?.mark();
  const flangeMomentNmm = tStubMomentNmm(trace, {
    lengthMm: section.widthMm,
    thicknessMm: section.flangeThicknessMm,
    yieldMpa: steel.yieldMpa,
    gammaM0,
  });
  const weaker = bendingRank(top) <= bendingRank(bottom) ? top : bottom;
  const stiffenerMomentNmm = tStubMomentNmm(trace, {
    lengthMm: 2 * weaker.widthMm,
    thicknessMm: weaker.thicknessMm,
    yieldMpa: weaker.steel.yieldMpa,
    gammaM0,
  });
  const { depthMm, flangeThicknessMm } = joint.beam.section;
  const frame = panelFrameShearN(
    trace,
    { flangeMomentNmm, stiffenerMomentNmm, spacingMm: depthMm - flangeThicknessMm },
    frameMark,
  );
  return stiffenedPanelShearN(trace, { panelN: plain, frameN: frame }, mark);
}

/** The panel as the option leaves it. @throws OutsideScope where the web is too slender (6.2.6.1(1)). */
export function columnPanelOf(node: NodeCase, design: PanelDesign, steps: boolean): ColumnPanel {
  const { section, steel } = design.column;
  const properties = sectionProperties(section);
  const epsilon = epsilonOf(null, { yieldMpa: steel.yieldMpa });
  const plates = design.webPlates;
  const shearArea = traced(steps, (trace) => {
    const own = shearAreaOf(trace, section, properties.areaMm2);
    return plates
      ? enlargedShearAreaMm2(
          trace,
          { shearAreaMm2: own, plateWidthMm: plates.widthMm, webThicknessMm: section.webThicknessMm },
          0,
        )
      : own;
  });
  const shearOf = (joint: JointCase | undefined): Traced =>
    traced(steps, (trace) => {
      trace?.include(shearArea.step);
      const numbers = { shearAreaMm2: shearArea.value, webDepthMm: properties.webDepthMm, epsilon };
      return shearResistance(trace, node, design, numbers, joint);
    });
  const [first, second] = node.joints;
  const own = shearOf(first);
  const isAlike = !second || isOnePanel(node.joints);
  const other = isAlike ? own : shearOf(second);
  return {
    section,
    steel,
    properties,
    epsilon,
    shearArea,
    shear: first?.side === "right" ? { left: other, right: own } : { left: own, right: other },
    webPlateMm: plates?.thicknessMm ?? 0,
    stiffestWebMm: section.webThicknessMm + (plates ? plates.sides * plates.thicknessMm : 0),
    compressionWebMm: (plates ? (plates.sides === 1 ? 1.5 : 2) : 1) * section.webThicknessMm,
    tensionWebMm: tensionWebMm(design),
  };
}
