import { molarMassGMol } from './notation';

/** g/mol of CaCO3, the trade's common measure. */
export const CACO3_G_MOL = molarMassGMol('CaCO3');
/** mg/L as CaCO3 in one eq/kg (two equivalents per mole; 1 L taken as 1 kg). */
export const CACO3_MG_PER_EQ = (1000 * CACO3_G_MOL) / 2;
/** mg/L as CaCO3 in one mol/kg. */
export const CACO3_MG_PER_MOL = 1000 * CACO3_G_MOL;
export const CARBON_MG_PER_MOL = 1000 * molarMassGMol('C');
export const CO2_MG_PER_MOL = 1000 * molarMassGMol('CO2');
