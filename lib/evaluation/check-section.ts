import type { ISection } from "@/lib/calc/node";
import { shownMm, type Problems } from "./resolve-errors";

/**
 * Refuses a section, given by its dimensions, whose parts do not fit together; the faults stand at the dimension.
 * Answers whether it is sound: nothing else is measured against one that is not.
 */
export function checkSection(section: ISection, path: string, problems: Problems): boolean {
  const before = problems.count;
  const { depthMm, widthMm, webThicknessMm, flangeThicknessMm, rootMm, make } = section;
  const [root, rootField] = make === "rolled" ? ["root radius", "r"] : ["weld", "weld"];
  if (2 * flangeThicknessMm >= depthMm) {
    problems.add(
      `${path}.tf`,
      `Two flanges of ${shownMm(flangeThicknessMm)} mm leave no web in a depth of ${shownMm(depthMm)} mm.`,
    );
  } else if (2 * (flangeThicknessMm + rootMm) >= depthMm) {
    problems.add(`${path}.${rootField}`, `The ${root} leaves no straight web between the flanges.`);
  }
  if (webThicknessMm >= widthMm) {
    problems.add(
      `${path}.tw`,
      `The web (${shownMm(webThicknessMm)} mm) is as wide as the flange (${shownMm(widthMm)} mm).`,
    );
  } else if (webThicknessMm + 2 * rootMm >= widthMm) {
    problems.add(`${path}.${rootField}`, `The ${root} reaches past the edge of the flange.`);
  }
  return problems.count === before;
}
