/**
 * Share of a triangle's projected area times mean depth under the level h: S·g(h) summed over a closed mesh
 * is its volume below h. g = ∫(h−z)₊ over the triangle, divided by its area; mm. Corner levels in any order.
 */
export function wetBelow(h: number, za: number, zb: number, zc: number): number {
  const z0 = Math.min(za, zb, zc);
  if (h <= z0) return 0;
  const z2 = Math.max(za, zb, zc);
  const sum = za + zb + zc;
  if (h >= z2) return h - sum / 3;
  const z1 = sum - z0 - z2;
  if (h < z1) return (h - z0) ** 3 / (3 * (z1 - z0) * (z2 - z0));
  return h - sum / 3 + (z2 - h) ** 3 / (3 * (z2 - z1) * (z2 - z0));
}
