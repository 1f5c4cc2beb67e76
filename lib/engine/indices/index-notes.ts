import type { WaterIndices } from '../types';

/** What a reader must know of an index before leaning on it. */
export interface IndexNote {
  readonly formula: string;
  readonly source: string;
  /** Where it was made for, or is used. */
  readonly use: string;
  /** What its sign or size says, in words; never a promise about lead or copper. */
  readonly sign: string;
}

/** Formula, source, range of use and sign of every index, in one place. Sources recalled, not read in print here. */
export const INDEX_NOTES: Readonly<Record<keyof WaterIndices, IndexNote>> = {
  calciteIndex: {
    formula: 'log10({Ca²⁺}{CO₃²⁻} / K calcite)',
    source: 'K: Plummer & Busenberg 1982; index: common practice',
    use: '0 to 90 °C, ionic strength to 0.5',
    sign: 'positive: calcite can form; negative: calcite can dissolve',
  },
  aragoniteIndex: {
    formula: 'log10({Ca²⁺}{CO₃²⁻} / K aragonite)',
    source: 'K: Plummer & Busenberg 1982; index: common practice',
    use: '0 to 90 °C, ionic strength to 0.5; warm waters and magnesium favour aragonite',
    sign: 'positive: aragonite can form; negative: aragonite can dissolve',
  },
  saturationPH: {
    formula: 'pK2 − pK calcite + p{Ca²⁺} + p{alkalinity}',
    source: 'Langelier 1936; constants Plummer & Busenberg 1982',
    use: 'pH 6.5 to 9.5, where alkalinity is nearly all bicarbonate',
    sign: 'above the water’s own pH the water can dissolve calcite; below it calcite can form',
  },
  langelier: {
    formula: 'pH − pHs',
    source: 'Langelier 1936, J. AWWA 28, 1500',
    use: 'pH 6.5 to 9.5',
    sign: 'positive: calcite can form; negative: calcite can dissolve',
  },
  precipitationPotentialMgLCaCO3: {
    formula: 'calcite formed when the closed water comes to rest with calcite',
    source: 'common practice (Standard Methods 2330); solved exactly',
    use: 'not for waters held by phosphate, nor for lead or copper pipe',
    sign: 'positive: that much calcite can come out; negative: that much can dissolve (some rules use the opposite sign)',
  },
  ryznar: {
    formula: '2 pHs − pH',
    source: 'Ryznar 1944, J. AWWA 36, 472',
    use: 'empirical, from hot-water mains; a rough guide',
    sign: 'below about 6 deposits grow; above about 7 they do not form',
  },
  puckorius: {
    formula: '2 pHs − (1.465 log10 alkalinity + 4.54)',
    source: 'Puckorius & Brooke 1991, Corrosion 47, 280',
    use: 'cooling waters of high alkalinity',
    sign: 'below about 6 deposits grow; above about 7 they do not form',
  },
  aggressiveness: {
    formula: 'pH + log10(calcium × alkalinity), both as CaCO₃',
    source: 'AWWA C400',
    use: 'asbestos-cement pipe, 4 to 27 °C',
    sign: '12 and above: not aggressive to cement; below 10: highly aggressive',
  },
  larson: {
    formula: '(chloride + sulfate) / carbonate alkalinity, in equivalents',
    source: 'Larson & Skold 1958, Corrosion 14, 285t',
    use: 'cold surface waters, iron and mild steel',
    sign: 'above about 0.8 chloride and sulfate may hinder a film on iron; above 1.2 corrosion is likely high',
  },
  chlorideSulfateMassRatio: {
    formula: 'chloride / sulfate, by mass',
    source: 'Edwards & Triantafyllidou 2007, J. AWWA 99(7), 96',
    use: 'a screening figure for galvanic attack after a change of coagulant',
    sign: 'higher favours galvanic attack; it forecasts no lead',
  },
  bufferIntensityMeqLPerPH: {
    formula: 'd(alkalinity) / d(pH) at constant inorganic carbon',
    source: 'Van Slyke 1922; Stumm & Morgan, Aquatic Chemistry',
    use: 'any water within the activity model',
    sign: 'never negative; small means that the pH drifts easily',
  },
  totalHardnessMgLCaCO3: {
    formula: 'calcium and magnesium as CaCO₃',
    source: 'Standard Methods 2340 B',
    use: 'any water',
    sign: 'never negative; more is harder',
  },
  carbonateHardnessMgLCaCO3: {
    formula: 'the smaller of total hardness and alkalinity',
    source: 'common practice',
    use: 'softening calculations',
    sign: 'never negative; what lime alone can remove',
  },
  nonCarbonateHardnessMgLCaCO3: {
    formula: 'total hardness − carbonate hardness',
    source: 'common practice',
    use: 'softening calculations',
    sign: 'never negative; what needs soda ash to remove',
  },
};
