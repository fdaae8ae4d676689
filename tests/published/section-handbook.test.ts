import { describe, expect, it } from "vitest";
import { sectionProperties } from "@/lib/calc/mechanics/section-properties";
import { findSection } from "@/lib/catalog/find-section";
import { sectionToCase } from "@/lib/evaluation/resolve-parts";
import { buildCatalog } from "../factories/build-node-document";

/**
 * Handbook values of rolled sections, as printed: A in cm2, I_y in cm4, W_el,y and W_pl,y in cm3.
 * IPE and HE: European section tables (sections of EN 10365, four figures). UB and UC: British section tables
 * (SCI P363, three figures). Guards the stated dimensions and the computed properties together.
 */
const HANDBOOK: readonly (readonly [string, number, number, number, number])[] = [
  ["IPE 80", 7.64, 80.1, 20, 23.2],
  ["IPE 160", 20.09, 869.3, 108.7, 123.9],
  ["IPE 240", 39.12, 3892, 324.3, 366.6],
  ["IPE 300", 53.81, 8356, 557.1, 628.4],
  ["IPE 400", 84.46, 23130, 1156, 1307],
  ["IPE 450", 98.82, 33740, 1500, 1702],
  ["IPE 600", 156, 92080, 3069, 3512],
  ["IPE A 100", 8.78, 141.2, 28.81, 32.98],
  ["IPE A 200", 23.47, 1591, 161.6, 181.7],
  ["IPE A 300", 46.53, 7173, 483.1, 541.8],
  ["IPE A 450", 85.55, 29760, 1331, 1494],
  ["IPE A 600", 137, 82920, 2778, 3141],
  ["IPE O 180", 27.1, 1505, 165.4, 189.1],
  ["IPE O 270", 53.84, 6947, 507.1, 574.6],
  ["IPE O 400", 96.39, 26750, 1324, 1502],
  ["IPE O 600", 196.8, 118300, 3879, 4471],
  ["HE 100 A", 21.2, 349.2, 72.76, 83.01],
  ["HE 200 A", 53.8, 3692, 388.6, 429.5],
  ["HE 260 A", 86.8, 10450, 836.4, 919.8],
  ["HE 300 A", 112.5, 18260, 1260, 1383],
  ["HE 450 A", 178, 63720, 2896, 3216],
  ["HE 800 A", 285.8, 303400, 7682, 8699],
  ["HE 100 B", 26, 449.5, 89.91, 104.2],
  ["HE 200 B", 78.1, 5696, 569.6, 642.5],
  ["HE 300 B", 149.1, 25170, 1678, 1869],
  ["HE 400 B", 197.8, 57680, 2884, 3232],
  ["HE 600 B", 270, 171000, 5701, 6425],
  ["HE 1000 B", 400, 644700, 12890, 14860],
  ["HE 100 M", 53.2, 1143, 190.4, 235.8],
  ["HE 240 M", 199.6, 24290, 1799, 2117],
  ["HE 300 M", 303.1, 59200, 3482, 4078],
  ["HE 500 M", 344.3, 161900, 6180, 7094],
  ["HE 900 M", 423.6, 570400, 12540, 14440],
  ["UB 127x76x13", 16.5, 473, 74.6, 84.2],
  ["UB 203x133x25", 32, 2340, 230, 258],
  ["UB 254x146x31", 39.7, 4410, 351, 393],
  ["UB 305x165x46", 58.7, 9900, 646, 720],
  ["UB 356x171x51", 64.9, 14100, 796, 896],
  ["UB 406x178x60", 76.5, 21600, 1060, 1200],
  ["UB 457x191x82", 104, 37100, 1610, 1830],
  ["UB 533x210x82", 105, 47500, 1800, 2060],
  ["UB 533x210x92", 117, 55200, 2070, 2360],
  ["UB 610x229x101", 129, 75800, 2520, 2880],
  ["UB 686x254x140", 178, 136000, 3990, 4560],
  ["UB 762x267x173", 220, 205000, 5390, 6200],
  ["UB 838x292x194", 247, 279000, 6640, 7640],
  ["UB 914x305x253", 323, 436000, 9500, 10900],
  ["UB 914x419x388", 494, 720000, 15600, 17700],
  ["UB 1016x305x222", 283, 408000, 8410, 9810],
  ["UC 152x152x23", 29.2, 1250, 164, 182],
  ["UC 152x152x37", 47.1, 2210, 273, 309],
  ["UC 203x203x46", 58.7, 4570, 450, 497],
  ["UC 203x203x86", 110, 9450, 850, 977],
  ["UC 254x254x73", 93.1, 11400, 898, 992],
  ["UC 254x254x107", 136, 17500, 1310, 1480],
  ["UC 254x254x167", 213, 30000, 2080, 2420],
  ["UC 305x305x97", 123, 22200, 1450, 1590],
  ["UC 305x305x158", 201, 38700, 2370, 2680],
  ["UC 305x305x283", 360, 78900, 4320, 5110],
  ["UC 356x368x129", 164, 40200, 2260, 2480],
  ["UC 356x368x202", 257, 66300, 3540, 3970],
  ["UC 356x406x340", 433, 123000, 6030, 7000],
  ["UC 356x406x634", 808, 275000, 11600, 14200],
];

const AREA_TOLERANCE = 0.005;
const BENDING_TOLERANCE = 0.01;

const deviation = (computed: number, printed: number): number => Math.abs(computed / printed - 1);

describe("section tables", () => {
  it("covers every family with more than forty sections", () => {
    const families = new Set(HANDBOOK.map(([name]) => findSection(buildCatalog(), name)?.family));
    expect([...families].sort()).toEqual(["HE A", "HE B", "HE M", "IPE", "IPE A", "IPE O", "UB", "UC"]);
    expect(HANDBOOK.length).toBeGreaterThan(40);
  });

  it.each(HANDBOOK)(
    "%s has the printed A, I, W_el and W_pl",
    (name, areaCm2, inertiaCm4, elasticCm3, plasticCm3) => {
      const row = findSection(buildCatalog(), name);
      expect(row?.designation).toBe(name);
      if (!row) return;
      const computed = sectionProperties(sectionToCase(row));
      expect(deviation(computed.areaMm2 / 1e2, areaCm2)).toBeLessThanOrEqual(AREA_TOLERANCE);
      expect(deviation(computed.inertiaMm4 / 1e4, inertiaCm4)).toBeLessThanOrEqual(BENDING_TOLERANCE);
      expect(deviation(computed.elasticModulusMm3 / 1e3, elasticCm3)).toBeLessThanOrEqual(BENDING_TOLERANCE);
      expect(deviation(computed.plasticModulusMm3 / 1e3, plasticCm3)).toBeLessThanOrEqual(BENDING_TOLERANCE);
    },
  );
});
