import { describe, expect, it } from "vitest";
import type { BoltRow } from "@/lib/calc/components/connection-view";
import { assembleRows } from "@/lib/calc/components/row-assembly";
import type { RowFamilyLimits } from "@/lib/calc/components/row-groups";
import type { TStubPart } from "@/lib/calc/components/t-stub-part";
import type { Traced } from "@/lib/calc/trace/traced";

/** Rows at levers 500, 400, 300 mm; bolts of 250 kN each, so that the straight line begins at 1.9 x 250 = 475 kN. */
const of = (value: number): Traced => ({ value, step: undefined });
const rows = [500, 400, 300].map(
  (leverMm, index) => ({ row: index + 1, leverMm, fastener: { tension: of(250) } }) as unknown as BoltRow,
);

interface Group {
  readonly last: number;
  readonly first: number;
  readonly limit: number;
}

const family = (alone: readonly (number | null)[], groups: readonly Group[] = []): RowFamilyLimits => ({
  alone: alone.map((value) => (value === null ? null : of(value))),
  groupsEndingAt: rows.map((_, index) =>
    groups
      .filter(({ last }) => last === index)
      .map(({ first, limit }) => ({ first, part: {} as TStubPart, limit: of(limit) })),
  ),
});

const forces = (families: readonly RowFamilyLimits[], limitN = Infinity, steps = false): number[] =>
  assembleRows(rows, families, limitN, true, steps).forces.map(({ value }) => value);

describe("rows of a joint, 6.2.7.2", () => {
  it("take the least of their parts, passing over a part that does not limit", () => {
    expect(forces([family([300, 320, 280]), family([null, 310, 290])])).toEqual([300, 310, 280]);
  });

  it("leave to later rows of a group what the earlier ones have not taken", () => {
    const flange = family(
      [300, 300, 300],
      [
        { first: 0, last: 1, limit: 520 },
        { first: 1, last: 2, limit: 400 },
        { first: 0, last: 2, limit: 650 },
      ],
    );
    // Row 2: 520 - 300; row 3: the lesser of 400 - 220 and 650 - 520.
    expect(forces([flange])).toEqual([300, 220, 130]);
  });

  it("are never less than nothing", () => {
    expect(forces([family([300, 300, 300], [{ first: 0, last: 1, limit: 250 }])])).toEqual([300, 0, 300]);
  });

  it("follow a straight line below a row close to the failure of its bolts", () => {
    expect(forces([family([475, 470, 470])])).toEqual([475, 470, 470]);
    // 480 is beyond 1.9 bolts: 480 x 400/500 and 480 x 300/500.
    expect(forces([family([480, 470, 470])])).toEqual([480, 384, 288]);
    // A second such row sets a line of its own, lower where it is shorter.
    expect(forces([family([600, 478, 470])])).toEqual([600, 478, 478 * 0.75]);
  });

  it("follow no line where the annex lifts it", () => {
    const { forces: lifted } = assembleRows(rows, [family([480, 470, 470])], Infinity, false, false);
    expect(lifted.map(({ value }) => value)).toEqual([480, 470, 470]);
  });

  it("are cut from the lowest row up by what the compression side and the panel carry", () => {
    const flange = family([300, 200, 100]);
    expect(forces([flange], 600)).toEqual([300, 200, 100]);
    expect(forces([flange], 540)).toEqual([300, 200, 40]);
    expect(forces([flange], 420)).toEqual([300, 120, 0]);
    expect(forces([flange], 250)).toEqual([250, 0, 0]);
    expect(assembleRows(rows, [flange], 420, true, false).totalN).toBe(420);
  });

  it("show the same numbers with their working", () => {
    const flange = family([480, 300, 300], [{ first: 0, last: 1, limit: 700 }]);
    const { forces: shown } = assembleRows(rows, [flange], 800, true, true);
    expect(shown.map(({ value }) => value)).toEqual(forces([flange], 800));
    expect(shown.map(({ step }) => step?.id)).toEqual([
      "en1993-1-8:2005/6.2.7.2/F_tr,Rd",
      "en1993-1-8:2005/6.2.7.2/F_tr,Rd",
      "en1993-1-8:2005/6.2.7.2/equilibrium",
    ]);
  });
});
