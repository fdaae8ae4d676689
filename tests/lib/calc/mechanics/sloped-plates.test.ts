import { describe, expect, it } from "vitest";
import { alongSlopeN, forceAlongN } from "@/lib/calc/mechanics/sloped-plates";
import { Trace } from "@/lib/calc/trace/trace";
import { expectHand } from "@/tests/support/evaluated-case";

/** Guards the statics of a plate that slopes 3 in 4: cosine 4 / 5. */
describe("a sloped plate", () => {
  it("carries along itself more than the horizontal force", () => expectHand(forceAlongN(400, 4 / 5), 500));

  it("resists horizontally less than along itself", () => {
    const trace = new Trace();
    expectHand(alongSlopeN(trace, 500, 4 / 5), 400);
    expect(trace.last()?.symbol).toBe("F_Rd");
  });

  it("uses the same share of its resistance either way it is looked at", () =>
    expectHand(300 / alongSlopeN(null, 500, 4 / 5), forceAlongN(300, 4 / 5) / 500));

  it("is a level plate at a cosine of 1, with nothing to show", () => {
    const trace = new Trace();
    expect(alongSlopeN(trace, 500, 1)).toBe(500);
    expect(trace.last()).toBeUndefined();
  });
});
