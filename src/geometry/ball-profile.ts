import type { Vec2 } from './shape';

/**
 * Half outline of a ball, (radius, height) from the lower pole to the upper, facets/2 chords, moved out from
 * its middle so that it encloses exactly the ball's volume when it is turned: the turned chords enclose
 * Σ π/3 (r₀² + r₀r₁ + r₁²)·Δz, which grows with the cube of the factor. Every chord stands off its arc alike,
 * inside in the middle and outside at its ends, so part volumes err only as facets⁻³.
 */
export function ballProfile(radius: number, facets: number): Vec2[] {
  const chords = facets / 2;
  const unit = Array.from({ length: chords + 1 }, (_, i): Vec2 => {
    if (i === 0) return [0, -1];
    if (i === chords) return [0, 1];
    const angle = Math.PI * (i / chords - 0.5);
    return [Math.cos(angle), Math.sin(angle)];
  });
  let turned = 0;
  for (let i = 0; i < chords; i += 1) {
    const [r0, z0] = unit[i]!;
    const [r1, z1] = unit[i + 1]!;
    turned += (Math.PI / 3) * (r0 * r0 + r0 * r1 + r1 * r1) * (z1 - z0);
  }
  const scale = radius * Math.cbrt((4 * Math.PI) / 3 / turned);
  return unit.map(([r, z]) => [r * scale, z * scale]);
}
