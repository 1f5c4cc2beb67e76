/**
 * The words of the engine. Amounts inside are mol per kg of water (1 L taken as 1 kg, below 0.5 % off to 30 °C);
 * the fields that face a user carry their unit in the name.
 */

/** What a laboratory reports. Unit of each: see ANALYTES in `constants/analytes.ts` (mg/L of the named form). */
export type Analyte =
  | 'calcium'
  | 'magnesium'
  | 'sodium'
  | 'potassium'
  | 'chloride'
  | 'sulfate'
  | 'nitrate'
  | 'fluoride'
  | 'ammonia'
  | 'phosphate'
  | 'silica'
  | 'boron'
  | 'iron'
  | 'manganese'
  | 'aluminum'
  | 'copper'
  | 'lead'
  | 'zinc'
  | 'barium'
  | 'strontium'
  | 'sulfide';

/** One analysis. Exactly two of pH, alkalinity, inorganic carbon and CO2 pressure are given. */
export interface WaterAnalysis {
  readonly temperatureC: number;
  readonly pH?: number;
  readonly alkalinityMgLCaCO3?: number;
  readonly inorganicCarbonMgLC?: number;
  readonly carbonDioxideAtm?: number;
  readonly analytesMgL: Readonly<Partial<Record<Analyte, number>>>;
}

/** Why the engine gives no answer. `message` is a plain sentence for the reader, `path` names the field at fault. */
export interface Refusal {
  readonly ok: false;
  readonly reason: 'badInput' | 'outOfRange' | 'notConverged' | 'targetUnreachable';
  readonly message: string;
  readonly path?: string;
}

export interface SolveEvidence {
  readonly iterations: number;
  /** Largest relative mass or charge residual at the end. */
  readonly residual: number;
}

/** A water at equilibrium in solution (solids are not formed unless a step asks for them). */
export interface Water {
  readonly temperatureC: number;
  readonly pH: number;
  readonly alkalinityMgLCaCO3: number;
  readonly inorganicCarbonMgLC: number;
  readonly carbonDioxideMgLCO2: number;
  readonly carbonDioxideAtm: number;
  readonly ionicStrengthMolKg: number;
  /** 100 × (cations − anions) / ((cations + anions) / 2) in equivalents; the unanalysed remainder is carried, never hidden. */
  readonly chargeBalancePercent: number;
  /** Totals of the conservative components, mol/kg, keyed by component (`Ca`, `Mg`, `CO3`, …, `charge`). */
  readonly totalsMolKg: Readonly<Record<string, number>>;
  readonly speciesMolKg: Readonly<Record<string, number>>;
  readonly activities: Readonly<Record<string, number>>;
  readonly saturationIndex: Readonly<Record<string, number>>;
  /** Solids the last step formed, mol/kg by solid key; negative where a solid dissolved. Absent when none did. */
  readonly precipitatedMolKg?: Readonly<Record<string, number>>;
  /** Plain sentences: what was absent and counted as zero, what lies outside a constant's range. */
  readonly assumptions: readonly string[];
  readonly evidence: SolveEvidence;
}

export type Solved = { readonly ok: true; readonly water: Water };

/** null where the index has no meaning for this water (no calcium, say). */
export interface WaterIndices {
  readonly calciteIndex: number | null;
  readonly aragoniteIndex: number | null;
  readonly saturationPH: number | null;
  readonly langelier: number | null;
  /** Positive: calcite would precipitate; negative: calcite would dissolve. */
  readonly precipitationPotentialMgLCaCO3: number | null;
  readonly ryznar: number | null;
  readonly puckorius: number | null;
  readonly aggressiveness: number | null;
  readonly larson: number | null;
  readonly chlorideSulfateMassRatio: number | null;
  readonly bufferIntensityMeqLPerPH: number;
  readonly totalHardnessMgLCaCO3: number;
  readonly carbonateHardnessMgLCaCO3: number;
  readonly nonCarbonateHardnessMgLCaCO3: number;
}

export type ReagentKey =
  | 'calcium-hydroxide'
  | 'calcium-oxide'
  | 'sodium-hydroxide'
  | 'sodium-carbonate'
  | 'sodium-bicarbonate'
  | 'potassium-hydroxide'
  | 'magnesium-hydroxide'
  | 'carbon-dioxide'
  | 'sulfuric-acid'
  | 'hydrochloric-acid'
  | 'aluminum-sulfate'
  | 'ferric-chloride'
  | 'ferric-sulfate'
  | 'ferrous-sulfate'
  | 'sodium-aluminate'
  | 'chlorine'
  | 'sodium-hypochlorite'
  | 'calcium-hypochlorite'
  | 'calcium-chloride'
  | 'calcium-sulfate'
  | 'sodium-fluoride'
  | 'hexafluorosilicic-acid'
  | 'phosphoric-acid'
  | 'sodium-silicate'
  | 'ammonia'
  | 'sodium-bisulfite'
  | 'polyaluminum-chloride'
  | 'ammonium-sulfate'
  | 'sodium-hexafluorosilicate'
  | 'monosodium-phosphate'
  | 'zinc-sulfate'
  | 'zinc-chloride';

/** A dose in mg/L of the pure compound (chlorine products: as Cl2). */
export interface Dose {
  readonly reagent: ReagentKey;
  readonly doseMgL: number;
  /** Water of hydration of the compound as weighed, mol/mol; without it the reagent's usual one (see REAGENTS). */
  readonly hydrate?: number;
  /** Of polyaluminium chloride: share (0…0.9) of the chloride replaced by hydroxide; 0.5 when left out. */
  readonly basicity?: number;
}

/** Quantities a dose can be asked to reach. */
export type TargetQuantity =
  | 'pH'
  | 'alkalinity'
  | 'inorganicCarbon'
  | 'calcium'
  | 'hardness'
  | 'langelier'
  | 'calciteIndex'
  | 'precipitationPotential'
  | 'larson'
  | 'chlorideSulfateMassRatio';

export interface DoseTarget {
  readonly quantity: TargetQuantity;
  readonly value: number;
}

/** Every dose that meets the target within 0…max (two when the quantity turns), or the range that can be reached. */
export type DoseSuggestion =
  | {
      readonly ok: true;
      readonly doses: readonly { readonly doseMgL: number; readonly water: Water }[];
      /** Speciations the search took. */
      readonly evaluations?: number;
    }
  | (Refusal & { readonly reachable?: { readonly from: number; readonly to: number } });

/** One line of the ledger: before + change = equilibrium. */
export interface LedgerRow {
  /** Species or quantity key (`HCO3-`, `alkalinity`). */
  readonly key: string;
  readonly before: number;
  readonly change: number;
  readonly equilibrium: number;
}

/** One reaction that ran between two states. Coefficients: products positive, reactants negative. */
export interface LedgerReaction {
  readonly key: string;
  readonly equation: string;
  readonly coefficients: Readonly<Record<string, number>>;
  readonly extentMolKg: number;
  readonly logK: number;
  /** log10 of the activity quotient at equilibrium; equals logK within the solver's tolerance. */
  readonly logQuotient: number;
  readonly source: string;
  /**
   * True for a reaction taken to run to its end (a coagulant's hydroxide, chlorine with sulfite). It rests at no
   * equilibrium, so its quotient is not defined: `logQuotient` then repeats `logK` and is not to be shown.
   */
  readonly complete?: boolean;
}

/** The account of one step: what was added, what reacted, and where every species came to rest (mol/kg). */
export interface Ledger {
  readonly reactions: readonly LedgerReaction[];
  /** `before` includes what the reagent brought in as fed; `change` is the sum of coefficient × extent. */
  readonly species: readonly LedgerRow[];
}
