import { describe, expect, it } from "vitest";
import { verdictSentence } from "@/lib/ranking/verdict";
import type {
  EvaluatedOptionDocument,
  OptionDocument,
  OutsideScopeOptionDocument,
  ResultDocument,
} from "@/lib/schemas/result-document";

type Evaluated = EvaluatedOptionDocument;
const ANY_MEASURE: Evaluated["measures"] = [
  { kind: "through-bars", levels: ["top"], size: "M24", grade: "10.9", innerNuts: true },
];

const estimate = (cost: number, shopMinutes: number): Evaluated["estimate"] => ({
  cost,
  currency: "EUR",
  minutesByTrade: {},
  shopMinutes,
  siteMinutes: 0,
  mass: 0,
  carbon: 0,
  costForQuantity: cost,
  costByCategory: {},
  lines: [],
});

function evaluated(key: string, name: string, utilisation: number, more: Partial<Evaluated> = {}): Evaluated {
  const passes = utilisation <= 1;
  return {
    key,
    name,
    measures: key === "bare" ? [] : ANY_MEASURE,
    passes,
    governing: { component: "column-web-compression", side: "right", loadCase: "ULS 3", utilisation },
    stiffnessReached: true,
    connectionFailure: null,
    sizing: null,
    cautions: [],
    joints: [],
    components: [],
    estimate: estimate(0, 0),
    rank: null,
    notRanked: passes ? null : "fails",
    ...more,
  };
}

const outside = (key: string, reason: string): OutsideScopeOptionDocument => ({
  key,
  name: key,
  measures: key === "bare" ? [] : ANY_MEASURE,
  outsideScope: { reason },
  rank: null,
  notRanked: "outside scope",
});

function result(
  options: OptionDocument[],
  target: ResultDocument["node"]["target"] = { utilisation: 1, stiffness: "any" },
): ResultDocument {
  const node = { reference: "C4", target } as ResultDocument["node"];
  return { node, basis: "EN 1993-1-8:2005", engine: "test", options };
}

/** Breaking and non-breaking spaces read the same. */
const say = (document: ResultDocument): string => verdictSentence(document).text.replaceAll("\u00a0", " ");

const bars = evaluated("bars-top-stiffeners-bottom", "Bars at top, stiffeners at bottom", 0.91, {
  rank: 1,
  estimate: estimate(318.4, 98),
});
const stiffeners = evaluated("stiffeners-both", "Stiffeners top and bottom", 0.87, {
  rank: 2,
  estimate: estimate(402.4, 166),
});

describe("verdictSentence", () => {
  it("names what fails on the bare column, the cheapest that passes and how far off the next is", () => {
    const document = result([evaluated("bare", "Bare column", 1.31), stiffeners, bars]);
    expect(say(document)).toBe(
      "The bare column fails: web compression on the right reaches 1.31 in ULS 3. " +
        "The cheapest that passes is bars at top, stiffeners at bottom: 318 EUR and 1 h 38 min in the shop a node. " +
        "Next comes stiffeners top and bottom, 84 EUR more.",
    );
  });

  it("marks the words that stand out, and its parts make up the text", () => {
    const verdict = verdictSentence(result([evaluated("bare", "Bare column", 1.31), bars]));
    expect(verdict.parts.filter(({ tone }) => tone !== undefined)).toEqual([
      { text: "fails", tone: "fail" },
      { text: "bars at top, stiffeners at bottom", tone: "strong" },
    ]);
    expect(verdict.parts.map(({ text }) => text).join("")).toBe(verdict.text);
  });

  it("says when only one option passes", () => {
    expect(say(result([evaluated("bare", "Bare column", 1.31), bars]))).toMatch(
      /a node\. No other option passes\.$/,
    );
  });

  it("says when the bare column is good enough and what stiffening would cost all the same", () => {
    const bare = evaluated("bare", "Bare column", 0.84, { rank: 1 });
    expect(say(result([bare, { ...bars, rank: 2 }]))).toBe(
      "The bare column is good enough: web compression on the right is highest at 0.84 in ULS 3. " +
        "No stiffening is needed. The cheapest stiffening would be bars at top, stiffeners at bottom, 318 EUR more a node.",
    );
    expect(say(result([bare]))).toMatch(/No stiffening is needed\.$/);
  });

  it("names the most used component where detailing that is met just so counts highest", () => {
    const check = (component: string, utilisation: number, more: object = {}) =>
      ({
        component,
        side: "left",
        loadCase: "ULS 1",
        utilisation,
        ...more,
      }) as Evaluated["components"][number];
    const bare = evaluated("bare", "Bare column", 1, {
      rank: 1,
      governing: { component: "detailing", side: "left", loadCase: "all", utilisation: 1 },
      components: [
        check("detailing", 1),
        check("joint-moment", 0.47),
        check("end-plate-bending", 0.47),
        check("column-web-shear", 0.2),
      ],
    });
    expect(say(result([bare]))).toMatch(
      /^The bare column is good enough: end-plate bending on the left is highest at 0\.47 in ULS 1\. /,
    );
    const broken = {
      ...bare,
      passes: false,
      rank: null,
      governing: { ...bare.governing, utilisation: 1.2 },
      components: [
        check("detailing", 1.2, { what: "edge distance of the plate" }),
        check("column-web-shear", 1.1),
      ],
    };
    expect(say(result([broken, bars]))).toMatch(
      /^The bare column fails: detailing on the left is not in order \(edge distance of the plate\)\. /,
    );
  });

  it("does not print 1.00 for what is over 1", () => {
    expect(say(result([evaluated("bare", "Bare column", 1.0032), bars]))).toContain("reaches 1.003 in");
    expect(say(result([evaluated("bare", "Bare column", 1.0001), bars]))).toContain(
      "reaches just over 1.00 in",
    );
  });

  it("tells the target where it is not 1", () => {
    const bare = evaluated("bare", "Bare column", 0.93, { passes: false });
    expect(say(result([bare, bars], { utilisation: 0.9, stiffness: "any" }))).toMatch(
      /^The bare column fails: web compression on the right reaches 0\.93 in ULS 3, above the target of 0\.90\. /,
    );
  });

  it("tells a want of stiffness from a want of strength", () => {
    const joint = { side: "left", loadCase: "ULS 2", initialStiffness: 71400 } as Evaluated["joints"][number];
    const stiffer = { ...joint, side: "right", initialStiffness: 90000 } as Evaluated["joints"][number];
    const bare = evaluated("bare", "Bare column", 0.8, {
      passes: false,
      stiffnessReached: false,
      joints: [stiffer, joint],
    });
    expect(say(result([bare, bars], { utilisation: 1, stiffness: 84000 }))).toMatch(
      /^The bare column fails: the left joint reaches 71 400 kNm\/rad of the 84 000 kNm\/rad asked for in ULS 2\. /,
    );
    expect(say(result([bare, bars], { utilisation: 1, stiffness: "rigid" }))).toMatch(
      /^The bare column fails: it is not rigid, the left joint reaches 71 400 kNm\/rad in ULS 2\. /,
    );
  });

  it("says when nothing passes and which comes nearest, with the reason", () => {
    const near = evaluated("stiffeners-both", "Stiffeners top and bottom", 1.08);
    expect(say(result([evaluated("bare", "Bare column", 1.31), near]))).toMatch(
      /No option passes\. The nearest is Stiffeners top and bottom, where web compression on the right reaches 1\.08 in ULS 3\.$/,
    );
    expect(say(result([evaluated("bare", "Bare column", 1.31), evaluated("x", "X", 1.4)]))).toMatch(
      /No option passes: none does better than the bare column\.$/,
    );
  });

  it("says when the connection itself fails that no stiffening cures it", () => {
    const failing = { connectionFailure: "Bolt tension on the left reaches 1.20 in ULS 1" };
    const document = result([
      evaluated("bare", "Bare column", 1.31, failing),
      evaluated("x", "X", 1.2, failing),
    ]);
    expect(say(document)).toMatch(
      /The connection itself fails: bolt tension on the left reaches 1\.20 in ULS 1\. No stiffening of the column cures that; change the connection first\.$/,
    );
  });

  it("says when the bare column or everything is outside the method", () => {
    const bare = outside("bare", "The beams' depths differ.");
    expect(say(result([bare, bars]))).toMatch(
      /^The bare column is outside the method: the beams' depths differ\. The cheapest/,
    );
    expect(say(result([bare, outside("x", "h above 400 mm")]))).toMatch(
      /No option can be judged: each is outside the method or set aside\.$/,
    );
  });

  it("judges given options without a bare column", () => {
    expect(say(result([bars]))).toMatch(/^The cheapest that passes is bars at top/);
    expect(say(result([]))).toBe("There is no option to compare.");
  });

  it("shows small money to the hundredth, large money in groups, and equal cost in words", () => {
    const bare = evaluated("bare", "Bare column", 1.31);
    const cheap = { ...bars, estimate: estimate(4.2, 5) };
    expect(say(result([bare, cheap, { ...stiffeners, estimate: estimate(1234.6, 60) }]))).toMatch(
      /: 4\.20 EUR and 5 min in the shop a node\. Next comes stiffeners top and bottom, 1 230 EUR more\.$/,
    );
    expect(say(result([bare, bars, { ...stiffeners, estimate: bars.estimate }]))).toMatch(
      /, at the same cost\.$/,
    );
    expect(say(result([bare, { ...bars, estimate: estimate(618, 0) }]))).toContain(
      "618 EUR and no added shop time a node.",
    );
  });
});
