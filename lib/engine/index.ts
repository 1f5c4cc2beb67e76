/** The engine's door: everything the screens, the server and the command line may use. */
export * from './types';
export { ENGINE_VERSION } from './version';
export { CONSTANTS_HASH } from './constants/table';
export { ANALYTES, type AnalyteInfo } from './constants/analytes';
export { formatSpecies } from './constants/notation';
export { REAGENTS, type ReagentInfo } from './reagents/catalogue';
export { solveWater } from './speciation/solve-water';
export { indicesOf } from './indices/indices-of';
export { precipitationPotentialAt } from './solids/precipitation-potential';
export { applyDose, applyDoses } from './steps/dose';
export { doseForTarget } from './planning/dose-for-target';
export { accountFor } from './ledger/account-for';
export { convert, UNITS, type Converted, type QuantityKind, type UnitOf } from './units';
