import { columns } from './columns';
import { levels as vertexLevels, type Mesh } from './mesh';
import type { Vec3 } from './vec3';

/** Spans of more rows than this, and of no small part of the whole height, are carried from row to row, as in the sweep. */
const carriedFrom = 12;
const carriedPart = 1e-2;

/**
 * Area of the mesh's own surface that stands below each of the strictly ascending levels (u·p, mm): the walls,
 * floors and ceilings that liquid touches, without its free surface. mm². Just above each level, so that a
 * level face counts from its own level on; at the last level just below it, so that a lid is left out.
 *
 * Σ W·a(h), W the area of a triangle and a the share of it below h: with corner levels z₀ ≤ z₁ ≤ z₂,
 * (h−z₀)²/((z₁−z₀)(z₂−z₀)) up to z₁, 1 − (z₂−h)²/((z₂−z₁)(z₂−z₀)) up to z₂, then 1. Exact for flat walls; round ones
 * converge as facets⁻². Only rounding is lost, about 1e-12 of the whole area. `up` is a unit vector.
 * O(triangles + rows); apart from the sweep, which upright walls do not concern.
 */
export function wettedArea(mesh: Mesh, up: Vec3, atLevels: Float64Array): Float64Array {
  const rows = atLevels.length;
  const { positions: p, triangles } = mesh;
  const z = vertexLevels(mesh, up);
  let low = Infinity;
  let high = -Infinity;
  for (const level of z) {
    if (level < low) low = level;
    if (level > high) high = level;
  }
  const slack = 1e-9 * Math.max(high - low, 0);
  const carried = carriedPart * (high - low);
  // the running quadratic: what joins it at each row, expanded about that row
  const [area, join0, join1, join2] = columns(4, rows);

  for (let n = 0; n < triangles.length; n += 3) {
    let i = triangles[n]!;
    let j = triangles[n + 1]!;
    let k = triangles[n + 2]!;
    const w = areaOf(p, i, j, k);
    if (w === 0) continue;
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
    if (r1 > r0) corner(r0, r1, z0, 0, z1 - z0, w / ((z1 - z0) * (z2 - z0)));
    if (r2 > r1) {
      corner(r1, r2, z2, z1 - z2, 0, -w / ((z2 - z1) * (z2 - z0)));
    }
    // from its second corner on the whole triangle counts, less the corner at its highest until that is met
    if (r1 < rows) join0[r1]! += w;
  }

  /** c·t² on rows from…to−1, t = h − tip kept within least…most. */
  function corner(from: number, to: number, tip: number, least: number, most: number, c: number) {
    if (to - from > carriedFrom && most - least > carried) {
      for (let end = 0; end < 2; end += 1) {
        const row = end === 0 ? from : to;
        if (row === rows) return;
        const t = atLevels[row]! - tip;
        const signed = end === 0 ? c : -c;
        join0[row]! += signed * t * t;
        join1[row]! += 2 * signed * t;
        join2[row]! += signed;
      }
      return;
    }
    for (let row = from; row < to; row += 1) {
      const t = Math.min(Math.max(atLevels[row]! - tip, least), most);
      area[row]! += c * t * t;
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

  let run0 = 0;
  let run1 = 0;
  let run2 = 0;
  for (let row = 0; row < rows; row += 1) {
    const step = row === 0 ? 0 : atLevels[row]! - atLevels[row - 1]!;
    run0 += step * (run1 + step * run2) + join0[row]!;
    run1 += 2 * step * run2 + join1[row]!;
    run2 += join2[row]!;
    area[row] = Math.max(area[row]! + run0, 0);
  }
  return area;
}

function areaOf(p: Float64Array, i: number, j: number, k: number): number {
  const [a, b, c] = [3 * i, 3 * j, 3 * k];
  const ux = p[b]! - p[a]!;
  const uy = p[b + 1]! - p[a + 1]!;
  const uz = p[b + 2]! - p[a + 2]!;
  const vx = p[c]! - p[a]!;
  const vy = p[c + 1]! - p[a + 1]!;
  const vz = p[c + 2]! - p[a + 2]!;
  return 0.5 * Math.hypot(uy * vz - uz * vy, uz * vx - ux * vz, ux * vy - uy * vx);
}
