import { evaluate, type Dimension } from './evaluate';
import { mostCharacters, parseExpression } from './expression';
import { spellOut, type Refused } from './spell-out';
import {
  litresPerImperialGallon,
  litresPerUsGallon,
  litresPerVolumeUnit,
  type VolumeUnit,
} from './volume-unit';

const words: Record<string, number> = {
  l: 1,
  litre: 1,
  litres: 1,
  liter: 1,
  liters: 1,
  ltr: 1,
  ml: 0.001,
  cl: 0.01,
  dl: 0.1,
  m3: 1000,
  usgal: litresPerUsGallon,
  impgal: litresPerImperialGallon,
};

const bare = /^(gal|gals|gallon|gallons)$/i;
const askWhich: Refused = {
  refused: 'Say which gallon: write “US gal” (3.785 L) or “imp gal” (4.546 L).',
};

const volume: Dimension = {
  name: 'volume',
  units: 'L, US gal or imp gal',
  unit: (word) => {
    if (bare.test(word)) return askWhich;
    const key = word.toLowerCase();
    return Object.hasOwn(words, key) ? words[key] : undefined;
  },
};

/**
 * Reads a volume as people write it: `55.5`, `20 L`, `12 US gal`, `3*20`. A number without a unit
 * is in the working unit; a bare "gal" is asked back.
 *
 * @returns litres, rounded to a millionth; or the sentence that says what would be right
 */
export function parseVolume(text: string, unit: VolumeUnit): { litres: number } | Refused {
  if (text.trim() === '') return { refused: 'Type a volume, such as 55.5 L or 12 US gal.' };
  if (text.length > mostCharacters) {
    return { refused: `A volume is written in at most ${mostCharacters} characters.` };
  }
  const plain = spellOut(text);
  if (typeof plain !== 'string') return plain;
  const expression = parseExpression(oneWordUnits(plain));
  if (expression === null) {
    return {
      refused: `“${text.trim()}” cannot be read as a volume: write it like 55.5 L or 12 US gal.`,
    };
  }
  const quantity = evaluate(expression, volume);
  if ('refused' in quantity) return quantity;
  const litres = quantity.measured ? quantity.value : quantity.value * litresPerVolumeUnit[unit];
  if (!Number.isFinite(litres))
    return { refused: 'That volume is too large: write it like 55.5 L.' };
  return { litres: Math.round(litres * 1e6) / 1e6 };
}

/** `US gal`, `U.S. gallons`, `imp. gal`, `UK gallons` as single words; m³ as m3. */
function oneWordUnits(text: string): string {
  const gallon = '\\s*gal(?:lon)?s?\\.?(?![a-z])';
  return text
    .replace(new RegExp(`u\\.?s\\.?(?:\\s*liquid)?${gallon}`, 'gi'), 'usgal')
    .replace(new RegExp(`(?:imp(?:erial)?|uk)\\.?${gallon}`, 'gi'), 'impgal')
    .replace(/m³/g, 'm3');
}
