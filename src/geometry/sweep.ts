import { columns } from './columns';
import { horizontalAxes } from './horizontal-axes';
import { levels as vertexLevels, type Mesh } from './mesh';
import { advance, carriedQuartic, join } from './quartic';
import type { Vec3 } from './vec3';

/** What stands below each level: arrays as long as the levels given. */
export interface Sweep {
  /** mm³ */
  volume: Float64Array;
  /** dV/dh, mm²: just above each level, at the last one just below it. */
  surface: Float64Array;
  /** ∫x dV, ∫y dV, ∫z dV, mm⁴, in the mesh's frame. */
  moments: readonly [Float64Array, Float64Array, Float64Array];
}

/**
 * Spans of more rows than this are carried as polynomials from row to row instead of row by row, unless they are
 * less than this part of the whole height. A polynomial that ends leaves a rounding of its highest coefficients
 * behind, which grows with the cube of the height above it: beside a face of a sheet that is met within a
 * millimetre of two metres it was 3e-11 of the volume.
 */
const carriedFrom = 12;
const carriedPart = 1e-2;

/**
 * Exact integration of a closed mesh up to each of the strictly ascending levels (u·p, mm). Doubles; the
 * only error is rounding, about 1e-13 of the whole volume. `up` is a unit vector. O(triangles + rows).
 *
 * The field (z − h)·u has divergence 1 and no flux through the surface z = h, so the volume is a sum over
 * the wet part of the mesh alone and no cap is ever built. Every triangle gives, with its projected area S
 * (positive when it faces down) and a function f that is linear along two horizontal axes,
 *   V = ∫(h−z)₊ dS,  Q = ∫V dh = ∫½(h−z)₊² dS,  M_f = ∫f·(h−z)₊ dS.
 * They are polynomials of degree ≤ 4 in h on three spans: up to its second corner only the corner triangle
 * at its lowest vertex is wet, then all but the one at its highest, then all of it. Integrals of f·g over a
 * triangle of area α with corner values f, g are α/12 (Σf·Σg + Σfᵢgᵢ). The height moment is h·V − Q.
 */
export function sweep(mesh: Mesh, up: Vec3, atLevels: Float64Array): Sweep {
  const rows = atLevels.length;
  const { triangles } = mesh;
  const z = vertexLevels(mesh, up);
  const [e1, e2] = horizontalAxes(up);
  const a = vertexLevels(mesh, e1);
  const b = vertexLevels(mesh, e2);
  const height = span(z);
  const slack = 1e-9 * height;
  const carried = carriedPart * height;

  const [volume, surface, integral, alongA, alongB, mx, my, mz] = columns(8, rows);
  const q = carriedQuartic(rows);
  const ma = carriedQuartic(rows);
  const mb = carriedQuartic(rows);

  for (let n = 0; n < triangles.length; n += 3) {
    let i = triangles[n]!;
    let j = triangles[n + 1]!;
    let k = triangles[n + 2]!;
    const s = -0.5 * ((a[j]! - a[i]!) * (b[k]! - b[i]!) - (b[j]! - b[i]!) * (a[k]! - a[i]!));
    if (s === 0) continue;
    if (z[i]! > z[j]!) [i, j] = [j, i];
    if (z[j]! > z[k]!) [j, k] = [k, j];
    if (z[i]! > z[j]!) [i, j] = [j, i];
    const z0 = z[i]!;
    const z1 = z[j]!;
    const z2 = z[k]!;
    const r0 = firstRow(z0);
    if (r0 === rows) continue;
    const r1 = firstRow(z1);
    const r2 = firstRow(z2);
    const d = z2 - z0;
    const a0 = a[i]!;
    const a1 = a[j]!;
    const a2 = a[k]!;
    const b0 = b[i]!;
    const b1 = b[j]!;
    const b2 = b[k]!;
    if (r1 > r0) {
      const d1 = z1 - z0;
      const ea = (a1 - a0) / d1 + (a2 - a0) / d;
      const eb = (b1 - b0) / d1 + (b2 - b0) / d;
      corner(r0, r1, z0, 0, d1, s / (d1 * d), a0, ea, b0, eb);
    }
    if (r2 > r1) {
      const d1 = z2 - z1;
      const ea = (a2 - a1) / d1 + (a2 - a0) / d;
      const eb = (b2 - b1) / d1 + (b2 - b0) / d;
      corner(r1, r2, z2, -d1, 0, -s / (d1 * d), a2, ea, b2, eb);
    }
    if (r1 < rows) {
      const h = atLevels[r1]!;
      const zSum = z0 + z1 + z2;
      const aSum = a0 + a1 + a2;
      const bSum = b0 + b1 + b2;
      const below = h - zSum / 3;
      const zz = (zSum * zSum + z0 * z0 + z1 * z1 + z2 * z2) / 12 - (zSum * zSum) / 9;
      q.joining[0][r1]! += (s * (below * below + zz)) / 2;
      q.joining[1][r1]! += s * below;
      q.joining[2][r1]! += s / 2;
      const az = (aSum * zSum + a0 * z0 + a1 * z1 + a2 * z2) / 12;
      const bz = (bSum * zSum + b0 * z0 + b1 * z1 + b2 * z2) / 12;
      ma.joining[0][r1]! += s * ((h * aSum) / 3 - az);
      ma.joining[1][r1]! += (s * aSum) / 3;
      mb.joining[0][r1]! += s * ((h * bSum) / 3 - bz);
      mb.joining[1][r1]! += (s * bSum) / 3;
    }
  }

  /**
   * A corner triangle with its tip at the level `tip`, on rows from…to−1. With t = h − tip (negative below a
   * highest vertex): V = c t³/3, Q = c t⁴/12, M_f = c/12 (4 f t³ + e t⁴), f at the tip and e its growth.
   */
  function corner(
    from: number,
    to: number,
    tip: number,
    least: number,
    most: number,
    c: number,
    fa: number,
    ea: number,
    fb: number,
    eb: number,
  ): void {
    if (to - from > carriedFrom && most - least > carried) {
      for (let end = 0; end < 2; end += 1) {
        const row = end === 0 ? from : to;
        if (row === rows) return;
        const t = atLevels[row]! - tip;
        const w = (end === 0 ? c : -c) / 12;
        join(q, row, w, 0, 1, t);
        join(ma, row, w, 4 * fa, ea, t);
        join(mb, row, w, 4 * fb, eb, t);
      }
      return;
    }
    for (let row = from; row < to; row += 1) {
      const t = Math.min(Math.max(atLevels[row]! - tip, least), most);
      const ct2 = c * t * t;
      const ct3 = ct2 * t;
      surface[row]! += ct2;
      volume[row]! += ct3 / 3;
      integral[row]! += (ct3 * t) / 12;
      alongA[row]! += (ct3 * (4 * fa + ea * t)) / 12;
      alongB[row]! += (ct3 * (4 * fb + eb * t)) / 12;
    }
  }

  /** First row at or above a level: one met within rounding counts, at the last row it does not. */
  function firstRow(level: number): number {
    let from = 0;
    let to = rows;
    while (from < to) {
      const middle = (from + to) >> 1;
      const h = atLevels[middle]!;
      if (middle < rows - 1 ? h >= level - slack : h > level + slack) to = middle;
      else from = middle + 1;
    }
    return from;
  }

  const [ux, uy, uz] = up;
  const [ax, ay, az] = e1;
  const [bx, by, bz] = e2;
  for (let row = 0; row < rows; row += 1) {
    const h = atLevels[row]!;
    const step = row === 0 ? 0 : h - atLevels[row - 1]!;
    advance(q, row, step);
    advance(ma, row, step);
    advance(mb, row, step);
    volume[row]! += q.run[1]!;
    surface[row]! += 2 * q.run[2]!;
    const a1 = alongA[row]! + ma.run[0]!;
    const b1 = alongB[row]! + mb.run[0]!;
    const u1 = h * volume[row]! - (integral[row]! + q.run[0]!);
    mx[row] = ax * a1 + bx * b1 + ux * u1;
    my[row] = ay * a1 + by * b1 + uy * u1;
    mz[row] = az * a1 + bz * b1 + uz * u1;
  }
  const moments = [mx, my, mz] as const;
  return { volume, surface, moments };
}

function span(values: Float64Array): number {
  let low = Infinity;
  let high = -Infinity;
  for (const value of values) {
    if (value < low) low = value;
    if (value > high) high = value;
  }
  return Math.max(high - low, 0);
}
