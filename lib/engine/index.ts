/** The engine's door: everything the screens, the server and the command line may use. */
export * from './types';
export { ENGINE_VERSION } from './version';
export { CONSTANTS_HASH } from './constants/table';
export { ANALYTES, type AnalyteInfo } from './constants/analytes';
export { formatSpecies } from './constants/notation';
export { REAGENTS, type ReagentInfo } from './reagents/catalogue';
export { checkProduct, dosesOfProduct, productFor, type Product } from './reagents/product';
export { solveWater } from './speciation/solve-water';
export { indicesOf } from './indices/indices-of';
export { INDEX_NOTES, type IndexNote } from './indices/index-notes';
export { precipitationPotentialAt } from './solids/precipitation-potential';
export { equilibrateWith } from './solids/equilibrate-with';
export { applyDose, applyDoses } from './steps/dose';
export { doseForTarget } from './planning/dose-for-target';
export { accountFor } from './ledger/account-for';
export { accountForStep, type StepTaken } from './ledger/account-for-step';
export { convert, UNITS, type Converted, type QuantityKind, type UnitOf } from './units';
export { blend, type Stream } from './steps/blend';
export { heat } from './steps/heat';
export { oxidise, type Oxidation, type Oxidised } from './steps/oxidise';
export { precipitate, type Precipitated, type Precipitation } from './steps/precipitate';
export { AIR_CO2_ATM, stripCarbonDioxide, type Stripping } from './steps/strip';
export { solveReactions, type GivenReaction, type ReactionTable } from './ledger/reaction-set';
export { planDoses } from './planning/plan';
export type {
  BindingTarget,
  Plan,
  PlanReagent,
  PlanRequest,
  PlanTarget,
  Violation,
} from './planning/plan-types';
export {
  disinfect,
  type Contact,
  type Disinfectant,
  type Inactivation,
  type Organism,
} from './disinfection/disinfect';
export {
  DEFAULT_ANALYTE_UNCERTAINTY,
  DEFAULT_UNCERTAINTIES,
  howSure,
  type Band,
  type HowSure,
  type Influence,
  type Measured,
  type Sampling,
  type Uncertainty,
} from './uncertainty/how-sure';
export {
  copperOneSolubilityOf,
  copperSolubilityOf,
  leadSolubilityOf,
  type Solubility,
} from './indices/metal-solubility';
