import { DipwrightError, type FieldFault } from '../errors';
import { liquids } from '../liquid/liquids';
import { sizePlusMinusByMeans, type TankSettings } from './settings';

/** What a new tank begins with; the safe fill is what the liquids list offers. */
export function startingSettings(liquid: TankSettings['liquid']): TankSettings {
  return {
    liquid,
    densityKgPerM3: null,
    safeFillPercent: liquids[liquid].safeFillPercent,
    outletMm: null,
    referenceHeightMm: null,
    measuredBy: 'tape',
    sizePlusMinusMm: sizePlusMinusByMeans.tape,
    dipPlusMinusMm: 2,
  };
}

/**
 * Settings after a change, with what follows from it: a listed liquid has its own density, and tape
 * and drawing their own ±. Throws `invalid` where the change contradicts itself; `at` is the JSON
 * Pointer of the object that held it.
 */
export function changedSettings(
  before: TankSettings,
  change: Partial<TankSettings>,
  at = '',
): TankSettings {
  const after: TankSettings = { ...before, ...definedOf(change) };
  const faults: FieldFault[] = [];

  if (after.liquid !== 'other') {
    if (typeof change.densityKgPerM3 === 'number') {
      faults.push({
        pointer: `${at}/densityKgPerM3`,
        detail: 'A density is typed only for "other": a liquid of the list has its own.',
      });
    }
    after.densityKgPerM3 = null;
  } else if (after.densityKgPerM3 === null) {
    faults.push({
      pointer: `${at}/densityKgPerM3`,
      detail: 'Give the density of this liquid in kg/m³: the list has none for "other".',
    });
  }

  // none has one spelling: an empty map would make another content of the same
  if (Object.keys(after.ownSizePlusMinusMm ?? {}).length === 0) delete after.ownSizePlusMinusMm;

  if (after.measuredBy !== 'stated') {
    const own = sizePlusMinusByMeans[after.measuredBy];
    if (change.sizePlusMinusMm !== undefined && change.sizePlusMinusMm !== own) {
      faults.push({
        pointer: `${at}/sizePlusMinusMm`,
        detail: `Sizes by ${after.measuredBy} are ± ${own} mm: choose "stated" to give another ±.`,
      });
    }
    after.sizePlusMinusMm = own;
  }

  if (faults.length > 0) throw new DipwrightError('invalid', faults[0]!.detail, { faults });
  return after;
}

function definedOf(change: Partial<TankSettings>): Partial<TankSettings> {
  return Object.fromEntries(Object.entries(change).filter(([, value]) => value !== undefined));
}
