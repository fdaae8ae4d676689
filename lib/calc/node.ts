/**
 * NodeCase: the one input of the calculation. Complete numbers in N, mm and N/mm2; no ids, no
 * defaults, no catalogue names to look up. `lib/evaluation/resolve-node-case.ts` makes it from a node document.
 */

export type Side = "left" | "right";
export type Level = "top" | "bottom";

/** Whose flanges a measure stands at where the two beams' levels differ; left out = both. */
export type MeasureSides = Side | "both";

export interface ISection {
  readonly designation: string;
  readonly make: "rolled" | "welded";
  readonly depthMm: number;
  readonly widthMm: number;
  readonly webThicknessMm: number;
  readonly flangeThicknessMm: number;
  /** Root radius of a rolled section; leg (throat x sqrt 2) of the web-to-flange weld of a welded one. */
  readonly rootMm: number;
}

/** Strength of one piece at its own thickness. */
export interface Steel {
  readonly grade: string;
  readonly yieldMpa: number;
  readonly ultimateMpa: number;
  readonly betaW: number;
}

export interface FastenerSize {
  readonly name: string;
  readonly diameterMm: number;
  readonly stressAreaMm2: number;
  readonly holeMm: number;
  /** ISO 4014 / 4032 hexagon. */
  readonly acrossFlatsMm: number;
  readonly acrossPointsMm: number;
  readonly headHeightMm: number;
  readonly nutHeightMm: number;
  /** ISO 7089. */
  readonly washerDiameterMm: number;
  readonly washerThicknessMm: number;
}

export interface FastenerGrade {
  readonly name: string;
  readonly yieldMpa: number;
  readonly ultimateMpa: number;
  /** Shear coefficient where the thread is in the shear plane, Table 3.4. */
  readonly alphaV: number;
}

export type Weld = { readonly kind: "fillet"; readonly throatMm: number } | { readonly kind: "butt" };

export interface ConnectionWelds {
  readonly topFlange: Weld;
  readonly bottomFlange: Weld;
  readonly web: Weld;
}

export interface EndPlateConnection {
  readonly kind: "end-plate";
  readonly plate: {
    readonly thicknessMm: number;
    readonly widthMm: number;
    readonly extensionTopMm: number;
    readonly extensionBottomMm: number;
    readonly steel: Steel;
    readonly hasStiffenedExtension: boolean;
  };
  readonly bolts: {
    readonly size: FastenerSize;
    readonly grade: FastenerGrade;
    readonly gaugeMm: number;
    /** Distance of each row below the outer face of the beam's top flange. */
    readonly rowsMm: readonly number[];
    readonly perRow: 2 | 4;
    /** Between the two outer bolts of a row of four; no resistance counts on them, their distances are checked. */
    readonly outerGaugeMm?: number;
    readonly preloaded: boolean;
  };
  readonly welds: ConnectionWelds;
}

export interface WeldedConnection {
  readonly kind: "welded";
  readonly welds: ConnectionWelds;
}

/** Top and seat angles, alike. */
export interface FlangeCleatConnection {
  readonly kind: "flange-cleats";
  readonly cleat: {
    /** The leg along the column's flange, and the one along the beam's. */
    readonly columnLegMm: number;
    readonly beamLegMm: number;
    readonly thicknessMm: number;
    readonly rootMm: number;
    /** Along the flanges. */
    readonly lengthMm: number;
    readonly steel: Steel;
  };
  /** A plate between the legs of each angle. */
  readonly isStiffened: boolean;
  /** Through the column's flange: distance from the heel of the angle. */
  readonly bolts: {
    readonly size: FastenerSize;
    readonly grade: FastenerGrade;
    readonly gaugeMm: number;
    readonly distanceMm: number;
  };
  /** Through the beam's flange: rows from the heel of the angle. */
  readonly beamBolts: {
    readonly size: FastenerSize;
    readonly grade: FastenerGrade;
    readonly gaugeMm: number;
    readonly rowsMm: readonly number[];
  };
  /** From the column's face to the end of the beam. */
  readonly gapMm: number;
  /** A pair of angles beside the beam's web, which no resistance counts on. */
  readonly webCleats: {
    readonly legMm: number;
    readonly thicknessMm: number;
    readonly lengthMm: number;
  } | null;
}

export type ConnectionCase = EndPlateConnection | WeldedConnection | FlangeCleatConnection;

export interface JointCase {
  readonly side: Side;
  readonly beam: { readonly section: ISection; readonly steel: Steel; readonly spanMm: number };
  /** How far this beam's top lies below the left beam's. */
  readonly levelOffsetMm: number;
  readonly connection: ConnectionCase;
}

export interface BeamActions {
  /** Positive with the beam's top flange in tension. */
  readonly momentNmm: number;
  /** Positive in compression. */
  readonly axialForceN: number;
  /** Positive downwards on the column. */
  readonly shearN: number;
}

export interface LoadCase {
  readonly name: string;
  readonly left: BeamActions | null;
  readonly right: BeamActions | null;
  readonly column: {
    readonly axialForceN: number;
    readonly momentAboveNmm: number;
    readonly momentBelowNmm: number;
    readonly shearAboveN: number;
    readonly shearBelowN: number;
  };
}

export type MeasureCase =
  | {
      readonly kind: "transverse-stiffeners";
      readonly levels: readonly Level[];
      readonly at?: MeasureSides;
      readonly thicknessMm: number;
      /** Each side of the web. */
      readonly widthMm: number;
      readonly length: "full" | number;
      readonly clipMm: number;
      readonly steel: Steel;
      readonly flangeWeld: Weld;
      readonly webWeld: Weld;
    }
  | {
      readonly kind: "diagonal-stiffeners";
      readonly arrangement: "single" | "cross" | "k";
      readonly towards: Side;
      readonly thicknessMm: number;
      readonly widthMm: number;
      readonly steel: Steel;
      readonly weld: Weld;
    }
  | {
      readonly kind: "web-plates";
      readonly sides: 1 | 2;
      readonly thicknessMm: number;
      readonly widthMm: number;
      readonly heightMm: number;
      readonly steel: Steel;
      readonly weld: Weld;
    }
  | {
      readonly kind: "backing-plates";
      readonly levels: readonly Level[];
      readonly at?: MeasureSides;
      readonly thicknessMm: number;
      readonly widthMm: number;
      readonly lengthMm: number;
      readonly steel: Steel;
    }
  | {
      readonly kind: "through-bars";
      readonly levels: readonly Level[];
      readonly at?: MeasureSides;
      /** The bolt rows that bars replace; left out = every row of the levels. */
      readonly rows?: {
        /** As the document numbers them, on the joint the measure stands at. */
        readonly numbers: readonly number[];
        /** Below the top of the left beam. */
        readonly heightsMm: readonly number[];
      };
      readonly size: FastenerSize;
      readonly grade: FastenerGrade;
      readonly innerNuts: boolean;
    }
  | { readonly kind: "heavier-column"; readonly section: ISection; readonly steel: Steel };

export type MeasureKind = MeasureCase["kind"];

export interface NodeCase {
  readonly partialFactors: { readonly gammaM0: number; readonly gammaM1: number; readonly gammaM2: number };
  readonly column: {
    readonly section: ISection;
    readonly steel: Steel;
    /** From the outer face of the nearest beam flange to the column's end; null = continuous. */
    readonly endDistanceAboveMm: number | null;
    readonly endDistanceBelowMm: number | null;
    readonly storeyHeightMm: number;
  };
  readonly joints: readonly JointCase[];
  readonly loadCases: readonly LoadCase[];
  readonly bracing: "braced" | "unbraced";
  readonly target: {
    readonly utilisation: number;
    readonly stiffness: "any" | "rigid" | { readonly nmmPerRad: number };
  };
  readonly tStubModeOne: "method-1" | "method-2";
  /** Whether a row close to the failure of its bolts bounds the rows below it always, or as the United Kingdom's annex has it. */
  readonly triangularLimit: "always" | "united-kingdom";
  /** How fillets along the tension flange resist: 4.5.3.2 or 4.5.3.3. */
  readonly flangeWelds: "directional" | "simplified";
}
