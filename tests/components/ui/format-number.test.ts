import { describe, expect, it } from "vitest";
import {
  formatFigures,
  formatMinutes,
  formatMoney,
  formatNumber,
  formatUtilisation,
  formatWholeMoney,
  moneyUnit,
} from "@/components/ui/format-number";

/** Spaces within numbers do not break; plain ones read better here. */
const plain = (text: string) => text.replace(/[\u202f\u00a0]/g, " ");

describe("numbers as they are shown", () => {
  it.each([
    [1.0004, 1, ">1.00"],
    [1.003, 1, "1.003"],
    [1.31, 1, "1.31"],
    [1, 1, "1.00"],
    [0.996, 1, "1.00"],
    [0.903, 0.9, "0.903"],
  ])("utilisation %f against %f never reads as the limit when it is over it", (value, limit, shown) => {
    expect(formatUtilisation(value, limit)).toBe(shown);
  });

  it("groups thousands from five digits and writes a true minus sign", () => {
    expect(plain(formatNumber(71_433))).toBe("71 433");
    expect(formatNumber(7143)).toBe("7143");
    expect(formatNumber(-12.34, 1)).toBe("−12.3");
    expect(formatNumber(-0.04, 1)).toBe("0.0");
  });

  it("keeps figures rather than decimals in a calculation", () => {
    expect(plain(formatFigures(687_700, 5))).toBe("687 700");
    expect(formatFigures(0.012345)).toBe("0.01235");
    expect(formatFigures(1)).toBe("1");
    expect(formatFigures(182_630_000, 5)).toBe("1.8263 × 10^8");
    expect(formatFigures(0)).toBe("0");
  });

  it("writes minutes as the shop does", () => {
    expect(formatMinutes(98)).toBe("1 h 38");
    expect(formatMinutes(59.6)).toBe("1 h 00");
    expect(formatMinutes(-12)).toBe("−0 h 12");
    expect(formatMinutes(0)).toBe("0 h 00");
  });

  it("writes money in whole units from 20 up, and never hides a small part as nothing", () => {
    expect(formatMoney(318.4)).toBe("318");
    expect(formatMoney(4.2)).toBe("4.20");
    expect(formatMoney(0)).toBe("0");
    expect(formatWholeMoney(0.3)).toBe("<1");
    expect(formatWholeMoney(9.8)).toBe("10");
    expect(moneyUnit("XXX")).toBe("index");
    expect(moneyUnit("EUR")).toBe("EUR");
  });
});
