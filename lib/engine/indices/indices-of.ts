import { CACO3_MG_PER_MOL } from '../constants/carbonate-equivalents';
import { molarMassGMol } from '../constants/notation';
import { precipitationPotentialAt } from '../solids/precipitation-potential';
import type { Water, WaterIndices } from '../types';
import { bufferIntensityOf } from './buffer-intensity';
import { carbonateAlkalinityOf } from './carbonate-alkalinity';
import { hardnessOf } from './hardness';
import { saturationPHOf } from './saturation-ph';

/** All indices of a water. Formula, source and use of each: see the function or line it comes from. */
export function indicesOf(water: Water): WaterIndices {
  const saturationPH = saturationPHOf(water);
  const hardness = hardnessOf(water);
  return {
    calciteIndex: water.saturationIndex['calcite'] ?? null,
    aragoniteIndex: water.saturationIndex['aragonite'] ?? null,
    saturationPH,
    langelier: langelierOf(water, saturationPH),
    precipitationPotentialMgLCaCO3: precipitationPotentialOf(water),
    ryznar: saturationPH === null ? null : 2 * saturationPH - water.pH,
    puckorius: puckoriusOf(water, saturationPH),
    aggressiveness: aggressivenessOf(water),
    larson: larsonOf(water),
    chlorideSulfateMassRatio: chlorideSulfateMassRatioOf(water),
    bufferIntensityMeqLPerPH: bufferIntensityOf(water),
    totalHardnessMgLCaCO3: hardness.total,
    carbonateHardnessMgLCaCO3: hardness.carbonate,
    nonCarbonateHardnessMgLCaCO3: hardness.nonCarbonate,
  };
}

/** pH − pHs: positive, calcite can form; negative, it can dissolve. */
export const langelierOf = (water: Water, saturationPH = saturationPHOf(water)): number | null =>
  saturationPH === null ? null : water.pH - saturationPH;

/** Precipitation potential at the water's own temperature, mg/L as CaCO3; null where it has no meaning. */
export function precipitationPotentialOf(water: Water): number | null {
  const potential = precipitationPotentialAt(water, water.temperatureC);
  return potential.ok ? potential.mgLCaCO3 : null;
}

/** 2 pHs − pHeq with pHeq = 1.465 log10(alkalinity) + 4.54 (Puckorius & Brooke 1991; alkalinity in mg/L as CaCO3). */
function puckoriusOf(water: Water, saturationPH: number | null): number | null {
  if (saturationPH === null || !(water.alkalinityMgLCaCO3 > 0)) return null;
  return 2 * saturationPH - (1.465 * Math.log10(water.alkalinityMgLCaCO3) + 4.54);
}

/** pH + log10(calcium × alkalinity), both mg/L as CaCO3 (AWWA C400; made for asbestos-cement pipe, 4 to 27 °C). */
function aggressivenessOf(water: Water): number | null {
  const calcium = (water.totalsMolKg['Ca'] ?? 0) * CACO3_MG_PER_MOL;
  const product = calcium * water.alkalinityMgLCaCO3;
  return product > 0 && calcium > 0 ? water.pH + Math.log10(product) : null;
}

/** (chloride + sulfate) / carbonate alkalinity in equivalents (Larson & Skold 1958; cold waters of the Great Lakes). */
export function larsonOf(water: Water): number | null {
  const carbonate = carbonateAlkalinityOf(water);
  if (!(carbonate > 0)) return null;
  return ((water.totalsMolKg['Cl'] ?? 0) + 2 * (water.totalsMolKg['SO4'] ?? 0)) / carbonate;
}

const CHLORIDE_G_MOL = molarMassGMol('Cl');
const SULFATE_G_MOL = molarMassGMol('SO4');

/** Chloride to sulfate by mass (Edwards & Triantafyllidou 2007); null without sulfate. */
export function chlorideSulfateMassRatioOf(water: Water): number | null {
  const sulfate = (water.totalsMolKg['SO4'] ?? 0) * SULFATE_G_MOL;
  return sulfate > 0 ? ((water.totalsMolKg['Cl'] ?? 0) * CHLORIDE_G_MOL) / sulfate : null;
}
