import { lpgRefusal, liquids, pressurisedNames, type CautionKey, type LiquidCode } from './liquids';

/** From this capacity a person may be tempted to climb in. Our own choice, no source. */
export const largeTankFromL = 500;

/**
 * What can hurt someone, in our own words: what to do first, then why. Shown where the risk is,
 * on screens and on every print. They replace no code and no licensed practice.
 */
export const cautions: Record<CautionKey, string> = {
  'drinking-water':
    'Keep a stick for this tank alone. Clean and disinfect it before every dip. Let only materials made for drinking water touch the water.',
  'foul-water':
    'Open this tank to fresh air and keep flames away: its gas can harm. Wash hands and stick afterwards, and never dip drinking water with this stick.',
  // petrol: Boat Safety Scheme, part 5, and published refuelling guidance; see docs/decisions/0302
  'fuel-vapour-petrol':
    'Petrol vapour ignites and lies low. Put out every flame, switch off engines and heaters, air the space. Touch the stick to bare metal of the filler before you dip, and wait after filling. No metered fill with petrol indoors. Electrical parts near it must be ignition-protected.',
  'fuel-vapour-diesel':
    'No flame and no smoking at the open tank. After filling, wait for the foam to settle. Touch the stick to bare metal of the filler before you dip. Let nothing drip into bilge or ground.',
  'unknown-liquid':
    'Read the safety sheet of this liquid before you open the tank. Kilograms hold only for the density named here.',
  'large-tank':
    'Never enter a tank to measure it: the air inside can kill. The rules for confined spaces apply.',
  weight:
    'A full tank is heavy. Check axle loads and payload before you fill; afloat, watch stability: a part-filled tank shifts.',
  'not-for-trade':
    'Not for trade or fiscal measurement. Local codes and licensed practice come first.',
};

/** What stays true of every dip with a loose stick. Boat Safety Scheme, standard 2.8: it must not strike the floor. */
export const stickCaution = 'Lower the stick gently: a dropped stick can hole the floor.';

/** The cautions of one tank, the most urgent first, the trade sentence last. */
export function cautionsFor(liquid: LiquidCode, capacityL: number): CautionKey[] {
  const own = liquids[liquid].cautions;
  if (capacityL < largeTankFromL) return [...own];
  const at = own.findIndex((key) => key === 'weight' || key === 'not-for-trade');
  return [...own.slice(0, at), 'large-tank', ...own.slice(at)];
}

/** Why there is no chart for this liquid, when its name is that of a gas held under pressure; else null. */
export function refusalOf(name: string): string | null {
  const words = name.toLowerCase().split(/[^a-z]+/);
  return words.some((word) => pressurisedNames.includes(word)) ? lpgRefusal : null;
}
