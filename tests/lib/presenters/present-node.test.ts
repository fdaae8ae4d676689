/** Guards the row of the register: what leads, what state the node is in, and what is not for everybody. */
import { describe, expect, it } from "vitest";
import { presentNodeRow, sectionInWords } from "@/lib/presenters/present-node";
import type { ProjectRow } from "@/lib/db/repositories/projects";
import type { Actor } from "@/lib/policies/roles";
import type { ComparisonSummary, RankedSummary } from "@/lib/schemas/comparison";
import { NodeRow } from "@/lib/schemas/node";
import { buildNodeDocument, buildSide } from "@/tests/factories/build-node-document";

const OWN = "0b0f6f0e-54a1-4a52-8d2f-6f4a30a0e1a1";
const actor: Actor = {
  personId: "9a1c5a52-93a9-4a36-8f2b-0d6a6a2b7b11",
  organisationId: OWN,
  role: "fabricator",
};
const projectOf = (organisationId: string): ProjectRow => ({
  id: "5f0c1f0e-6a9d-4c5e-9a55-1d2f3a4b5c6d",
  organisationId,
  organisationName: "Tarnbeck",
  memberIds: new Set([actor.personId]),
  isLocked: false,
  name: "Hall",
  description: "",
  version: 1,
  nodeCount: 1,
  updatedAt: new Date(0),
});

const node = {
  id: "5f0c1f0e-6a9d-4c5e-9a55-1d2f3a4b5c6e",
  projectId: "5f0c1f0e-6a9d-4c5e-9a55-1d2f3a4b5c6d",
  reference: "C4 / level 2",
  document: buildNodeDocument({
    right: buildSide({ beam: { section: "IPE 400", steel: "S355", span: 6000 } }),
  }),
  version: 4,
  savedBy: { id: actor.personId, name: "Maren Oake" },
  savedAt: new Date("2026-11-30T12:00:00Z"),
  excluded: ["cheap"],
};

const ranked = (key: string, rank: number, cost: number): RankedSummary => ({
  key,
  name: key,
  rank,
  cost,
  utilisation: 0.9,
  currency: "EUR",
  shopMinutes: 60,
});
const fails = {
  passes: false,
  utilisation: 1.31,
  component: "column-web-compression",
  side: "left",
  loadCase: "ULS 1",
} as const;
const row = (summary: ComparisonSummary | undefined, organisationId = OWN) => {
  const keys = { nodeId: node.id, engine: "e", pricesKey: "p", catalogKey: "c" };
  const stored = summary === undefined ? undefined : { ...keys, summary };
  return presentNodeRow(actor, projectOf(organisationId), node, stored, ["Newer rates."]);
};

describe("a row of the register", () => {
  it("names column, beams, quantity and the governing component of the bare column", () => {
    const shown = row({ bare: fails, ranked: [] });
    expect(NodeRow.parse(shown)).toEqual(shown);
    expect(shown).toMatchObject({
      column: "HE 300 A",
      beams: { left: "IPE 450", right: "IPE 400" },
      quantity: 12,
      version: 4,
      bare: fails,
      outdated: ["Newer rates."],
    });
  });

  it("leads with the best option that is not set aside", () => {
    const shown = row({ bare: fails, ranked: [ranked("cheap", 1, 50), ranked("next", 2, 80)] });
    expect(shown.leading).toMatchObject({ key: "next", cost: 80, currency: "EUR" });
    expect(shown.state).toBe("solved");
  });

  it("shows a member from outside an index, not money", () => {
    const shown = row({ bare: fails, ranked: [ranked("cheap", 1, 50), ranked("next", 2, 80)] }, "another");
    expect(shown.leading).toMatchObject({ key: "next", cost: 160, currency: "XXX" });
  });

  it.each([
    [undefined, "not-compared"],
    [{ bare: { ...fails, passes: true, utilisation: 0.8 }, ranked: [ranked("bare", 1, 0)] }, "bare-passes"],
    [{ bare: fails, ranked: [ranked("next", 1, 1)] }, "solved"],
    [{ bare: fails, ranked: [] }, "nothing-passes"],
    [{ bare: fails, ranked: [ranked("cheap", 1, 1)] }, "nothing-passes"],
    [{ bare: { outsideScope: "Too slender." }, ranked: [] }, "outside-scope"],
    [{ bare: { outsideScope: "Too slender." }, ranked: [ranked("next", 1, 1)] }, "solved"],
    [{ bare: null, ranked: [] }, "nothing-passes"],
  ] as const)("says where the node stands: %j is %s", (summary, state) => {
    expect(row(summary as ComparisonSummary | undefined).state).toBe(state);
  });
});

it("writes a section of one's own by its dimensions", () => {
  expect(sectionInWords("UC 254x254x107")).toBe("UC 254x254x107");
  expect(sectionInWords({ h: 600, b: 300, tw: 12, tf: 20, weld: 6 })).toBe("welded 600 × 300 × 12 / 20");
  expect(sectionInWords({ h: 600, b: 300, tw: 12, tf: 20, r: 27 })).toBe("rolled 600 × 300 × 12 / 20");
});
