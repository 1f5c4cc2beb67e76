import type { Analyte } from '../types';
import type { Component } from './components';
import { molarMassGMol } from './notation';

export interface AnalyteInfo {
  readonly key: Analyte;
  /** Plain name. */
  readonly label: string;
  readonly unitLabel: string;
  /** What one mg/L is a milligram of. */
  readonly formula: string;
  readonly molarMassGMol: number;
  readonly component: Component;
  /** Largest amount the model accepts, mg/L: beyond it a unit slip is certain. */
  readonly largestMgL: number;
}

const analyte = (
  key: Analyte,
  label: string,
  unitLabel: string,
  formula: string,
  component: Component,
  largestMgL: number,
): AnalyteInfo => ({
  key,
  label,
  unitLabel,
  formula,
  molarMassGMol: molarMassGMol(formula),
  component,
  largestMgL,
});

/** Every analyte, the form its mg/L is counted in, and the component it feeds. */
export const ANALYTES: Readonly<Record<Analyte, AnalyteInfo>> = {
  calcium: analyte('calcium', 'calcium', 'mg/L', 'Ca', 'Ca', 50_000),
  magnesium: analyte('magnesium', 'magnesium', 'mg/L', 'Mg', 'Mg', 50_000),
  sodium: analyte('sodium', 'sodium', 'mg/L', 'Na', 'Na', 100_000),
  potassium: analyte('potassium', 'potassium', 'mg/L', 'K', 'K', 50_000),
  chloride: analyte('chloride', 'chloride', 'mg/L', 'Cl', 'Cl', 100_000),
  sulfate: analyte('sulfate', 'sulfate', 'mg/L', 'SO4', 'SO4', 100_000),
  nitrate: analyte('nitrate', 'nitrate', 'mg/L as NO₃', 'NO3', 'NO3', 20_000),
  fluoride: analyte('fluoride', 'fluoride', 'mg/L', 'F', 'F', 10_000),
  ammonia: analyte('ammonia', 'ammonia', 'mg/L as N', 'N', 'NH4', 10_000),
  phosphate: analyte('phosphate', 'orthophosphate', 'mg/L as P', 'P', 'PO4', 10_000),
  silica: analyte('silica', 'silica', 'mg/L as SiO₂', 'SiO2', 'Si', 10_000),
  boron: analyte('boron', 'boron', 'mg/L as B', 'B', 'B', 10_000),
  iron: analyte('iron', 'iron', 'mg/L', 'Fe', 'Fe2', 10_000),
  manganese: analyte('manganese', 'manganese', 'mg/L', 'Mn', 'Mn', 10_000),
  aluminum: analyte('aluminum', 'aluminium', 'mg/L', 'Al', 'Al', 10_000),
  copper: analyte('copper', 'copper', 'mg/L', 'Cu', 'Cu2', 10_000),
  lead: analyte('lead', 'lead', 'mg/L', 'Pb', 'Pb', 10_000),
  zinc: analyte('zinc', 'zinc', 'mg/L', 'Zn', 'Zn', 10_000),
  barium: analyte('barium', 'barium', 'mg/L', 'Ba', 'Ba', 10_000),
  strontium: analyte('strontium', 'strontium', 'mg/L', 'Sr', 'Sr', 10_000),
  sulfide: analyte('sulfide', 'sulfide', 'mg/L as S', 'S', 'S', 10_000),
};

export const ANALYTE_KEYS = Object.keys(ANALYTES) as readonly Analyte[];

export const isAnalyte = (key: string): key is Analyte => Object.hasOwn(ANALYTES, key);
