import type { Vec2 } from './shape';

/**
 * 1 when a, b, c turn against the clock, −1 with it, 0 when they lie on one line: of the given doubles, without
 * rounding. Double precision decides where its own error cannot change the sign (Shewchuk's bound for the
 * orientation test, 1997, from memory); else the products are taken in whole numbers.
 */
export function orientation(a: Vec2, b: Vec2, c: Vec2): number {
  const one = (a[0] - c[0]) * (b[1] - c[1]);
  const other = (a[1] - c[1]) * (b[0] - c[0]);
  const turn = one - other;
  if (Math.abs(turn) > 3.4e-16 * (Math.abs(one) + Math.abs(other))) return Math.sign(turn);
  const [ax, ay, bx, by, cx, cy] = [...a, ...b, ...c].map(scaled) as [
    bigint,
    bigint,
    bigint,
    bigint,
    bigint,
    bigint,
  ];
  const exact = (ax - cx) * (by - cy) - (ay - cy) * (bx - cx);
  return exact > 0n ? 1 : exact < 0n ? -1 : 0;
}

/** A double as a whole number of the smallest steps that doubles have, 2^−1074. */
function scaled(value: number): bigint {
  const bits = new BigUint64Array(Float64Array.of(value).buffer)[0]!;
  const exponent = (bits >> 52n) & 0x7ffn;
  const fraction = bits & 0xfffffffffffffn;
  const size = exponent === 0n ? fraction : (fraction | 0x10000000000000n) << (exponent - 1n);
  return value < 0 ? -size : size;
}
