import type { Expression } from './expression';
import type { Refused } from './spell-out';

/** A number, or an amount in the base unit (mm or L) once a unit was named. */
export interface Quantity {
  value: number;
  measured: boolean;
}

/** What the units are of, in words for the sentences. */
export interface Dimension {
  /** "length", "volume" */
  name: string;
  /** "mm, cm, m, in or ft" */
  units: string;
  /** How much of the base unit one such unit is; a sentence when the word must be asked back; undefined when unknown. */
  unit(word: string): number | Refused | undefined;
}

/**
 * Walks an expression. Units multiply only the number beside them; two amounts may be added, an
 * amount may be multiplied or divided by a number, and nothing else is sense.
 */
export function evaluate(node: Expression, dimension: Dimension): Quantity | Refused {
  if (node.is === 'number') return { value: node.value, measured: false };
  if (node.is === 'unit') {
    const size = dimension.unit(node.word);
    if (typeof size === 'object') return size;
    if (size === undefined) return unknownUnit(node.word, dimension);
    return { refused: `Put a number before “${node.word}”, such as 12 ${node.word}.` };
  }
  if (node.is === 'negative') {
    const inner = evaluate(node.of, dimension);
    return 'refused' in inner ? inner : { ...inner, value: -inner.value };
  }
  if (node.is === 'measure') return measure(node.of[0], node.of[1], dimension);
  const a = evaluate(node.of[0], dimension);
  if ('refused' in a) return a;
  const b = evaluate(node.of[1], dimension);
  if ('refused' in b) return b;
  if (node.is === 'product') {
    if (a.measured && b.measured)
      return {
        refused: `A ${dimension.name} times a ${dimension.name} is not a ${dimension.name}: multiply by a plain number.`,
      };
    return { value: a.value * b.value, measured: a.measured || b.measured };
  }
  if (node.is === 'quotient') {
    if (b.measured) return { refused: `Divide by a plain number, not by a ${dimension.name}.` };
    if (b.value === 0) return { refused: 'Nothing can be divided by 0: divide by another number.' };
    return { value: a.value / b.value, measured: a.measured };
  }
  if (a.measured !== b.measured)
    return { refused: `Give every part a unit, or none: ${dimension.units}.` };
  return { value: node.is === 'sum' ? a.value + b.value : a.value - b.value, measured: a.measured };
}

function measure(number: Expression, unit: Expression, dimension: Dimension): Quantity | Refused {
  if (unit.is !== 'unit') return { refused: 'Put +, −, × or ÷ between two numbers.' };
  const size = dimension.unit(unit.word);
  if (size === undefined) return unknownUnit(unit.word, dimension);
  if (typeof size === 'object') return size;
  const amount = evaluate(number, dimension);
  if ('refused' in amount) return amount;
  if (amount.measured) return { refused: 'Put +, −, × or ÷ between two measures.' };
  return { value: amount.value * size, measured: true };
}

function unknownUnit(word: string, dimension: Dimension): Refused {
  return { refused: `“${word}” is not a unit of ${dimension.name} here: use ${dimension.units}.` };
}
