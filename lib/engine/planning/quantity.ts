import { molarMassGMol } from '../constants/notation';
import { hardnessOf } from '../indices/hardness';
import {
  chlorideSulfateMassRatioOf,
  langelierOf,
  larsonOf,
  precipitationPotentialOf,
} from '../indices/indices-of';
import type { TargetQuantity, Water } from '../types';

const CALCIUM_MG_PER_MOL = 1000 * molarMassGMol('Ca');

const QUANTITIES: Readonly<Record<TargetQuantity, (water: Water) => number | null>> = {
  pH: (water) => water.pH,
  alkalinity: (water) => water.alkalinityMgLCaCO3,
  inorganicCarbon: (water) => water.inorganicCarbonMgLC,
  calcium: (water) => (water.totalsMolKg['Ca'] ?? 0) * CALCIUM_MG_PER_MOL,
  hardness: (water) => hardnessOf(water).total,
  langelier: (water) => langelierOf(water),
  calciteIndex: (water) => water.saturationIndex['calcite'] ?? null,
  precipitationPotential: precipitationPotentialOf,
  larson: larsonOf,
  chlorideSulfateMassRatio: chlorideSulfateMassRatioOf,
};

export const isTargetQuantity = (key: string): key is TargetQuantity =>
  Object.hasOwn(QUANTITIES, key);

/**
 * A target quantity of a water, null where it has no meaning. Units: alkalinity, hardness and precipitation potential
 * mg/L as CaCO3, inorganic carbon mg/L C, calcium mg/L Ca.
 */
export const quantityOf = (water: Water, quantity: TargetQuantity): number | null =>
  QUANTITIES[quantity](water);

export const QUANTITY_NAMES: Readonly<Record<TargetQuantity, string>> = {
  pH: 'pH',
  alkalinity: 'alkalinity',
  inorganicCarbon: 'inorganic carbon',
  calcium: 'calcium',
  hardness: 'hardness',
  langelier: 'the Langelier index',
  calciteIndex: 'the calcite saturation index',
  precipitationPotential: 'the precipitation potential',
  larson: 'the Larson ratio',
  chlorideSulfateMassRatio: 'the chloride to sulfate ratio',
};
