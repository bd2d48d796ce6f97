/**
 * The liquids list. `densityKgPerM3` is the figure that litres become kilograms with; where a
 * standard gives a range it is a round figure inside it.
 */
export interface Liquid {
  code: LiquidCode;
  /** As printed large on paper and shown first on screen. */
  name: string;
  /** null: the density is typed for this tank. */
  densityKgPerM3: number | null;
  densitySource: string;
  /** Which end of the tank is the emergency. */
  watch: 'low' | 'high';
  /** Keys of the cautions that stand on prints and screens for this liquid: see cautions.ts. */
  cautions: readonly CautionKey[];
  /** Safe fill offered for a new tank, % of brim. Common practice, no source. */
  safeFillPercent: number;
}

export const liquidCodes = [
  'drinking-water',
  'grey-water',
  'black-water',
  'diesel',
  'petrol',
  'urea-solution',
  'seawater',
  'heating-oil',
  'other',
] as const;
export type LiquidCode = (typeof liquidCodes)[number];

export type CautionKey =
  | 'not-for-trade'
  | 'drinking-water'
  | 'foul-water'
  | 'fuel-vapour-petrol'
  | 'fuel-vapour-diesel'
  | 'unknown-liquid'
  | 'large-tank'
  | 'weight';

const always = ['weight', 'not-for-trade'] as const;

export const liquids: Record<LiquidCode, Liquid> = {
  'drinking-water': {
    code: 'drinking-water',
    name: 'Drinking water',
    densityKgPerM3: 998,
    densitySource: 'M. Tanaka et al., Metrologia 38 (2001) 301: 998.2 kg/m³ at 20 °C',
    watch: 'low',
    cautions: ['drinking-water', ...always],
    safeFillPercent: 95,
  },
  'grey-water': {
    code: 'grey-water',
    name: 'Grey water',
    densityKgPerM3: 1000,
    densitySource: 'taken as water; common practice, no source',
    watch: 'high',
    cautions: ['foul-water', ...always],
    safeFillPercent: 90,
  },
  'black-water': {
    code: 'black-water',
    name: 'Black water',
    densityKgPerM3: 1000,
    densitySource: 'taken as water; common practice, no source',
    watch: 'high',
    cautions: ['foul-water', ...always],
    safeFillPercent: 90,
  },
  diesel: {
    code: 'diesel',
    name: 'Diesel',
    densityKgPerM3: 840,
    densitySource: 'EN 590: 820 to 845 kg/m³ at 15 °C',
    watch: 'low',
    cautions: ['fuel-vapour-diesel', ...always],
    safeFillPercent: 95,
  },
  petrol: {
    code: 'petrol',
    name: 'Petrol',
    densityKgPerM3: 745,
    densitySource: 'EN 228: 720 to 775 kg/m³ at 15 °C (from memory)',
    watch: 'low',
    cautions: ['fuel-vapour-petrol', ...always],
    safeFillPercent: 95,
  },
  'urea-solution': {
    code: 'urea-solution',
    name: 'Urea solution',
    densityKgPerM3: 1090,
    densitySource: 'ISO 22241-1: 1087 to 1093 kg/m³ at 20 °C',
    watch: 'low',
    cautions: [...always],
    safeFillPercent: 95,
  },
  seawater: {
    code: 'seawater',
    name: 'Seawater',
    densityKgPerM3: 1025,
    densitySource:
      'UNESCO Tech. Papers Mar. Sci. 44: 1027.7 kg/m³ at 35 and 5 °C; 1025 is common practice',
    watch: 'low',
    cautions: [...always],
    safeFillPercent: 95,
  },
  'heating-oil': {
    code: 'heating-oil',
    name: 'Heating oil',
    densityKgPerM3: 840,
    densitySource: 'taken as diesel; common practice, no source',
    watch: 'low',
    cautions: ['fuel-vapour-diesel', ...always],
    safeFillPercent: 97,
  },
  other: {
    code: 'other',
    name: 'Other liquid',
    densityKgPerM3: null,
    densitySource: 'typed for this tank',
    watch: 'low',
    cautions: ['unknown-liquid', ...always],
    safeFillPercent: 95,
  },
};

/** Why the list has no LPG, in words for whoever asks for it. */
export const lpgRefusal =
  'LPG is not offered: it is held under pressure, is filled only through its own automatic stop at 80 % ' +
  'by a trained person, and must never be opened or dipped. Keep to the maker’s plate and a competent gas fitter.';

/** Words by which people ask for LPG or another pressurised gas. */
export const pressurisedNames = ['lpg', 'propane', 'butane', 'autogas', 'gpl', 'lng', 'cng'];
