import { epsilonOf, rolledShearAreaMm2, weldedShearAreaMm2 } from "../clauses/en1993-1-1-2005/members";
import {
  enlargedShearAreaMm2,
  panelFrameShearN,
  panelShearN,
  stiffenedPanelShearN,
} from "../clauses/en1993-1-8-2005/column-web";
import { tStubMomentNmm } from "../clauses/en1993-1-8-2005/t-stub";
import { isOnePanel } from "../mechanics/panel-levels";
import { bracedPanelShearN } from "../mechanics/diagonal-formulas";
import { sectionProperties, type SectionProperties } from "../mechanics/section-properties";
import type { PanelDesign, TransverseStiffeners } from "../measures/panel-design";
import type { ISection, JointCase, NodeCase, Side, Steel } from "../node";
import type { Trace } from "../trace/trace";
import { traced, type Traced } from "../trace/traced";
import { panelDiagonalsOf, type PanelDiagonals } from "./panel-diagonals";

/** The column panel's own numbers, the same in every load case. */
export interface ColumnPanel {
  readonly section: ISection;
  readonly steel: Steel;
  readonly properties: SectionProperties;
  readonly epsilon: number;
  /** With a web plate as enlarged by 6.2.6.1(6). */
  readonly shearArea: Traced;
  /** V_wp,Rd of the web and its plates alone. */
  readonly plainShear: Traced;
  readonly diagonals: PanelDiagonals | null;
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

/** What the frame of column flanges and full-depth pairs at both levels of a joint adds, N; 0 without them. */
function frameShear(
  trace: Trace | null,
  node: NodeCase,
  design: PanelDesign,
  joint: JointCase | undefined,
): number {
  const { section, steel } = design.column;
  const { gammaM0 } = node.partialFactors;
  if (!joint) return 0;
  const { top, bottom } = design.stiffeners[joint.side];
  if (!top || !bottom || top.length !== "full" || bottom.length !== "full") return 0;
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
  return panelFrameShearN(
    trace,
    { flangeMomentNmm, stiffenerMomentNmm, spacingMm: depthMm - flangeThicknessMm },
    frameMark,
  );
}

/** The web's own resistance with what frame and diagonals add to it, N. */
function shearResistance(
  trace: Trace | null,
  node: NodeCase,
  design: PanelDesign,
  plain: Traced,
  diagonals: PanelDiagonals | null,
  joint: JointCase | undefined,
): number {
  const mark = trace?.mark();
  trace?.include(plain.step);
  const frameN = frameShear(trace, node, design, joint);
  if (!diagonals) {
    return frameN > 0 ? stiffenedPanelShearN(trace, { panelN: plain.value, frameN }, mark) : plain.value;
  }
  trace?.include(diagonals.resistance.step);
  trace?.include(diagonals.cosine.step);
  return bracedPanelShearN(
    trace,
    {
      panelN: plain.value,
      frameN,
      count: diagonals.count,
      diagonalN: diagonals.resistance.value,
      cosine: diagonals.cosine.value,
    },
    mark,
  );
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
  const plainShear = traced(steps, (trace) => {
    trace?.include(shearArea.step);
    return panelShearN(
      trace,
      {
        shearAreaMm2: shearArea.value,
        yieldMpa: steel.yieldMpa,
        webDepthMm: properties.webDepthMm,
        webThicknessMm: section.webThicknessMm,
        epsilon,
        gammaM0: node.partialFactors.gammaM0,
      },
      0,
    );
  });
  const diagonals = design.diagonals && panelDiagonalsOf(node, section, design.diagonals, steps);
  const shearOf = (joint: JointCase | undefined): Traced =>
    traced(steps, (trace) => shearResistance(trace, node, design, plainShear, diagonals, joint));
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
    plainShear,
    diagonals,
    shear: first?.side === "right" ? { left: other, right: own } : { left: own, right: other },
    webPlateMm: plates?.thicknessMm ?? 0,
    stiffestWebMm: section.webThicknessMm + (plates ? plates.sides * plates.thicknessMm : 0),
    compressionWebMm: (plates ? (plates.sides === 1 ? 1.5 : 2) : 1) * section.webThicknessMm,
    tensionWebMm: tensionWebMm(design),
  };
}
