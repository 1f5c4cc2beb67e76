import { molarMassGMol } from '../constants/notation';
import { SOLIDS_BY_KEY, solidFormula } from '../constants/table';
import { indicesOf } from '../indices/indices-of';
import type { Water } from '../types';
import type { Json } from './read';

/** A water as the batch output writes it. */
export function describeWater(water: Water): Json {
  const indices = indicesOf(water);
  return {
    pH: water.pH,
    alkalinity: water.alkalinityMgLCaCO3,
    inorganicCarbon: water.inorganicCarbonMgLC,
    carbonDioxide: water.carbonDioxideMgLCO2,
    pCO2: water.carbonDioxideAtm,
    ionicStrength: water.ionicStrengthMolKg,
    chargeBalance: water.chargeBalancePercent,
    saturationIndex: water.saturationIndex,
    langelier: indices.langelier,
    pHs: indices.saturationPH,
    precipitationPotential: indices.precipitationPotentialMgLCaCO3,
    ryznar: indices.ryznar,
    puckorius: indices.puckorius,
    aggressiveness: indices.aggressiveness,
    larson: indices.larson,
    chlorideSulfateMassRatio: indices.chlorideSulfateMassRatio,
    bufferIntensity: indices.bufferIntensityMeqLPerPH,
    hardness: indices.totalHardnessMgLCaCO3,
    species: water.speciesMolKg,
    ...(water.precipitatedMolKg ? { precipitated: massesOf(water.precipitatedMolKg) } : {}),
    assumptions: water.assumptions,
  };
}

/** mg/L of each solid from mol/kg. */
function massesOf(moles: Readonly<Record<string, number>>): Json {
  return Object.fromEntries(
    Object.entries(moles).map(([key, amount]) => {
      const row = SOLIDS_BY_KEY.get(key)?.row;
      return [key, row ? amount * 1000 * molarMassGMol(solidFormula(row)) : NaN];
    }),
  );
}
