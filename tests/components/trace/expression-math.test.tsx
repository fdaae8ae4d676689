import { render } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { ExpressionMath } from "@/components/trace/expression-math";

const symbols = { yieldMpa: ["f_y,wc", "N/mm2"], areaMm2: ["A_vc", "mm2"] } as const;

describe("a formula set as mathematics", () => {
  it("draws a quotient as a fraction, a root as a root, and symbols with their index", () => {
    const { container } = render(
      <ExpressionMath expression="0.9 * yieldMpa * areaMm2 / sqrt(3)" symbols={symbols} symbol="V_wp,Rd" />,
    );
    expect(container.querySelector("math")?.namespaceURI).toBe("http://www.w3.org/1998/Math/MathML");
    expect(container.querySelector("mfrac > :first-child")?.textContent).toBe("0.9·fy,wc·Avc");
    expect(container.querySelector("mfrac .radicand")?.textContent).toBe("3");
    expect(container.querySelector("[style]")).toBeNull();
  });

  it("puts the numbers in, a negative one in brackets, and closes with the result and its unit", () => {
    const { container } = render(
      <ExpressionMath
        expression="yieldMpa * areaMm2"
        symbols={symbols}
        inputs={{ yieldMpa: 355, areaMm2: -3728 }}
        result={{ value: -1_323_440, unit: "N" }}
      />,
    );
    expect(container.textContent?.replace(/\s/g, "")).toBe("=355·(−3728)=(−1323440)N");
  });

  it("falls back to the line as it is written", () => {
    const { container } = render(<ExpressionMath expression="something ## else" symbols={{}} symbol="x" />);
    expect(container.querySelector("code")?.textContent).toBe("x = something ## else");
  });
});
