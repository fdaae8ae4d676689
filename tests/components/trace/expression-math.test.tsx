import { render } from "@testing-library/react";
import { describe, expect, it } from "vitest";
import { ExpressionMath } from "@/components/trace/expression-math";

const symbols = { yieldMpa: ["f_y,wc", "N/mm2"], areaMm2: ["A_vc", "mm2"] } as const;

/** Text of each cell of a table of cases, row by row. */
const casesShown = () =>
  [...document.querySelectorAll("mtr")].map((line) =>
    [...line.querySelectorAll(":scope > mtd")].map((cell) => cell.textContent),
  );

it("sets a choice within a choice as one list of cases", () => {
  render(<ExpressionMath expression="a <= 1 ? 1 : (a <= 2 ? 2 : 3)" symbols={{ a: ["a", "1"] }} />);
  expect(casesShown()).toEqual([
    ["1", "where\u00a0a≤1"],
    ["2", "where\u00a0a≤2"],
    ["3", "otherwise"],
  ]);
  expect(document.querySelectorAll("mtable")).toHaveLength(1);
});

it("sets a symbol that is a product with an index to each factor, and one with words as it is", () => {
  render(
    <ExpressionMath expression="a * b" symbols={{ a: ["b_eff t_wc", "mm2"], b: ["F_c,Rd yielding", "N"] }} />,
  );
  const parts = [...document.querySelectorAll("msub")].map((sub) =>
    [...sub.children].map((c) => c.textContent),
  );
  expect(parts).toEqual([
    ["b", "eff"],
    ["t", "wc"],
    ["F", "c,Rd yielding"],
  ]);
});

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
