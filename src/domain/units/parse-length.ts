import { evaluate, type Dimension } from './evaluate';
import { mostCharacters, parseExpression, type Expression } from './expression';
import { mmPerFoot, mmPerInch, mmPerLengthUnit, type LengthUnit } from './length-unit';
import { spellOut, type Refused } from './spell-out';

const words: Record<string, number> = {
  mm: 1,
  millimetre: 1,
  millimetres: 1,
  millimeter: 1,
  millimeters: 1,
  cm: 10,
  centimetre: 10,
  centimetres: 10,
  centimeter: 10,
  centimeters: 10,
  m: 1000,
  metre: 1000,
  metres: 1000,
  meter: 1000,
  meters: 1000,
  in: mmPerInch,
  inch: mmPerInch,
  inches: mmPerInch,
  ins: mmPerInch,
  ft: mmPerFoot,
  foot: mmPerFoot,
  feet: mmPerFoot,
};

const length: Dimension = {
  name: 'length',
  units: 'mm, cm, m, in or ft',
  unit: (word) =>
    Object.hasOwn(words, word.toLowerCase()) ? words[word.toLowerCase()] : undefined,
};

/**
 * Reads a length as people write it: `412`, `41.2 cm`, `16 1/4 in`, `16½`, `2*150+12`,
 * `5 ft 3 in`, `16"`. A number without a unit is in the working unit. While that is inches, one
 * decimal other than .5 (`16.4`) is asked back: it may be tenths of an inch or four eighths.
 *
 * @param text as typed
 * @param unit the working unit
 * @returns millimetres, rounded to a millionth; or the sentence that says what would be right
 */
export function parseLength(text: string, unit: LengthUnit): { mm: number } | Refused {
  if (text.trim() === '') return { refused: `Type a length, such as ${example(unit)}.` };
  if (text.length > mostCharacters) {
    return { refused: `A length is written in at most ${mostCharacters} characters.` };
  }
  const plain = spellOut(text);
  if (typeof plain !== 'string') return plain;
  const hyphen = /(?<![\d.])(\d+)-(\d+)\/(\d+)(?![\d.])/.exec(plain);
  if (hyphen && (unit === 'in' || /inch|\bin\b/i.test(plain))) {
    const [, whole, top, bottom] = hyphen;
    return {
      refused: `Write ${whole} ${top}/${bottom} for ${whole} and ${top}/${bottom}, or ${whole} - (${top}/${bottom}) to take it away.`,
    };
  }
  const expression = parseExpression(joinCompounds(inchWord(plain)));
  if (expression === null) {
    return {
      refused: `“${text.trim()}” cannot be read as a length: write it like ${example(unit)}.`,
    };
  }
  const tenths = mayBeEighths(expression, unit);
  if (tenths !== undefined) return askEighths(tenths);
  const quantity = evaluate(expression, length);
  if ('refused' in quantity) return quantity;
  const mm = quantity.measured ? quantity.value : quantity.value * mmPerLengthUnit[unit];
  if (!Number.isFinite(mm))
    return { refused: `That length is too large: write it like ${example(unit)}.` };
  return { mm: Math.round(mm * 1e6) / 1e6 };
}

/** `in` is an operator to the parser; `inch` is a plain word. */
function inchWord(text: string): string {
  return text.replace(/(?<![a-z])ins?(?![a-z])/gi, 'inch');
}

/** `5 ft 3 inch` and `1 m 20 cm` are one measure each. */
function joinCompounds(text: string): string {
  const part = String.raw`(\d+(?:\.\d+)?|\([\d+/]+\)|\d+/\d+)`;
  return text
    .replace(
      new RegExp(`${part} ?(ft|foot|feet) ?${part}(?: ?(?:inch|inches)(?![a-z]))?`, 'gi'),
      '($1 ft + $3 inch)',
    )
    .replace(new RegExp(`${part} ?m ?${part} ?(cm|mm)(?![a-z])`, 'gi'), '($1 m + $2 $3)')
    .replace(new RegExp(`${part} ?cm ?${part} ?mm(?![a-z])`, 'gi'), '($1 cm + $2 mm)');
}

/** The first number of inches with one decimal that may be tenths or eighths, while a stick in eighths is at work. */
function mayBeEighths(node: Expression, unit: LengthUnit): number | undefined {
  if (unit !== 'in') return undefined;
  if (node.is === 'number') return tenthsOf(node.value) === undefined ? undefined : node.value;
  if (node.is === 'measure') {
    const [number, word] = node.of;
    const inches = word.is === 'unit' && length.unit(word.word) === mmPerInch;
    return inches && number.is === 'number' ? mayBeEighths(number, unit) : undefined;
  }
  if (node.is === 'negative') return mayBeEighths(node.of, unit);
  if (node.is === 'sum' || node.is === 'difference') {
    return mayBeEighths(node.of[0], unit) ?? mayBeEighths(node.of[1], unit);
  }
  return undefined;
}

/** The single decimal of a number when eighths could be meant by it: 1 to 7, but 5 is a half. */
function tenthsOf(value: number): number | undefined {
  const digit = Math.round((value - Math.floor(value)) * 10);
  const single = Math.abs(value - Math.floor(value) - digit / 10) < 1e-9;
  return single && digit >= 1 && digit <= 7 && digit !== 5 ? digit : undefined;
}

function askEighths(inches: number): Refused {
  const whole = Math.floor(inches);
  const near = `${whole} ${Math.round((inches - whole) * 8)}/8`;
  const meant = `${whole} ${tenthsOf(inches)}/8`;
  const nearest = near === meant ? '' : `, or ${near}, the eighth nearest to ${inches}`;
  return {
    refused: `${inches} may be tenths or eighths of an inch: write ${meant} for eighths${nearest}.`,
  };
}

function example(unit: LengthUnit): string {
  return unit === 'in'
    ? '16 1/4, 41.2 cm or 2*6+3'
    : unit === 'cm'
      ? '41.2, 412 mm or 16 1/4 in'
      : '412, 41.2 cm or 16 1/4 in';
}
