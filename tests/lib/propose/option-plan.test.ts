import { describe, expect, it } from "vitest";
import { planOptions } from "@/lib/propose/option-plan";
import { boltedJoint, M24, sampleNode, STOCK, weldedJoint } from "./sample-node";

const keys = (...parameters: Parameters<typeof planOptions>): readonly string[] =>
  planOptions(...parameters).map(({ key }) => key);

const twoSided = [boltedJoint("left"), boltedJoint("right")];

describe("planOptions", () => {
  it("offers every kind on a bolted node with a beam on both sides, the bare column first", () => {
    expect(keys(sampleNode(twoSided, [[200, 150]]), STOCK)).toEqual([
      "bare",
      "stiffeners-compression",
      "stiffeners-tension",
      "stiffeners-both",
      "web-plate-one-side",
      "web-plate-both-sides",
      "backing-plates",
      "bars-top",
      "bars-bottom",
      "bars-both",
      "heavier-column",
    ]);
  });

  it("says in the name where stiffeners go, and follows a reversed moment", () => {
    const name = (moment: number) =>
      planOptions(sampleNode(twoSided, [[moment, moment]]), STOCK).find(
        ({ key }) => key === "stiffeners-compression",
      )?.name;
    expect(name(200)).toBe("Stiffeners at bottom");
    expect(name(-200)).toBe("Stiffeners at top");
  });

  it("names single levels by where they are once both are pulled and pushed", () => {
    const reversed = keys(
      sampleNode(twoSided, [
        [200, 150],
        [-60, -90],
      ]),
      STOCK,
    );
    expect(reversed).toContain("stiffeners-top");
    expect(reversed).toContain("stiffeners-bottom");
    expect(reversed).not.toContain("stiffeners-compression");
  });

  it("offers partial depth to a beam on one side alone, and stays within 14", () => {
    const oneSided = keys(sampleNode([boltedJoint("left")], [[200, 0]]), STOCK);
    expect(oneSided).toContain("stiffeners-compression-partial");
    expect(oneSided).toHaveLength(13);
    expect(new Set(oneSided).size).toBe(13);
  });

  it("offers no bars and no backing plates where a beam is welded on, and no heavier column where there is none", () => {
    const welded = keys(sampleNode([weldedJoint("left"), boltedJoint("right")], [[200, 150]]), {
      ...STOCK,
      columns: [],
    });
    expect(welded.filter((key) => /^(bars|backing|heavier)/.test(key))).toEqual([]);
  });

  it("leaves out bars whose size the model does not cover", () => {
    const thin = { ...STOCK.bars[0]!, size: { ...M24, name: "M12", diameterMm: 12 } };
    expect(keys(sampleNode(twoSided, [[200, 150]]), { ...STOCK, bars: [thin] })).not.toContain("bars-top");
  });
});
