import { describe, expect, it } from "vitest";
import type { MeasureCase } from "@/lib/calc/node";
import { partialLengthsMm, stiffenerSpace, stiffenerWidthsMm } from "@/lib/propose/stiffener-space";
import { boltedJoint, sampleNode, STOCK, weldedJoint } from "./sample-node";

const node = sampleNode([boltedJoint("left"), boltedJoint("right")], [[200, 200]]);
type Stiffeners = Extract<MeasureCase, { kind: "transverse-stiffeners" }>;

describe("stiffenerWidthsMm", () => {
  it("takes the beam flange's reach and the column's outstand, in whole steps of 5 mm", () => {
    // (190 - 8.5) / 2 = 90.75 up to 95; (300 - 8.5) / 2 = 145.75 down to 145
    expect(stiffenerWidthsMm(node)).toEqual([95, 145]);
  });

  it("is widened by a wide gauge, so that the stiffener counts for the flange", () => {
    const wide = boltedJoint("left");
    if (wide.connection.kind !== "end-plate") throw new Error("bolted");
    const connection = { ...wide.connection, bolts: { ...wide.connection.bolts, gaugeMm: 180 } };
    // (1.33 x 180 - 8.5) / 2 = 115.45 up to 120
    expect(stiffenerWidthsMm(sampleNode([{ ...wide, connection }], [[200, 0]]))).toEqual([120, 145]);
  });

  it("never passes the column's flange", () => {
    const narrow = { ...node.column.section, widthMm: 180 };
    expect(stiffenerWidthsMm({ ...node, column: { ...node.column, section: narrow } })).toEqual([85]);
  });
});

describe("stiffenerSpace", () => {
  const shapes = stiffenerSpace(node, STOCK, ["bottom"], ["full"]).map(
    (shape) => shape.build([0, 1])[0] as Stiffeners,
  );

  it("matches the plate to the beam's flange of 14.6 mm: from 12 mm to twice the flange", () => {
    expect([...new Set(shapes.map(({ thicknessMm }) => thicknessMm))]).toEqual([12, 15, 20, 25]);
  });

  it("leaves out plates that are too slender for their outstand", () => {
    // 14 sqrt(235 / 355) x 12 = 136.7 < 145
    expect(shapes.filter(({ thicknessMm }) => thicknessMm === 12).map(({ widthMm }) => widthMm)).toEqual([
      95,
    ]);
  });

  it("clips the corner by at least the root radius and climbs the throats from 3 mm", () => {
    expect(shapes[0]).toMatchObject({
      levels: ["bottom"],
      length: "full",
      clipMm: 30,
      flangeWeld: { kind: "fillet", throatMm: 3 },
      webWeld: { kind: "fillet", throatMm: 4 },
    });
  });

  it("has nothing to offer without a throat", () => {
    expect(stiffenerSpace(node, { ...STOCK, throatsMm: [2] }, ["top"], ["full"])).toEqual([]);
  });
});

it("tries half and three quarters of the clear depth where the depth is partial", () => {
  // 290 - 2 x 14 = 262: 131 up to 135, 196.5 up to 200
  expect(partialLengthsMm(sampleNode([weldedJoint("left")], [[200, 0]]))).toEqual([135, 200]);
});
