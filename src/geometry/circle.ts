import type { Axis, Vec2 } from './shape';
import { axisOrder } from './shape';
import type { Vec3 } from './vec3';

/**
 * Factor that moves the corners of a regular polygon out until it encloses exactly the circle's
 * area: N/2 · r'² sin θ = π r² with θ = 2π/N gives r'/r = √(θ / sin θ).
 */
export function areaPreservingFactor(facets: number): number {
  const theta = (2 * Math.PI) / facets;
  return Math.sqrt(theta / Math.sin(theta));
}

/** Corners of an area-preserving polygon, against the clock, the first one at `phase` radians. mm */
export function circleOutline(radius: number, facets: number, phase: number): Vec2[] {
  return ellipseOutline(radius, radius, facets, phase);
}

/**
 * The same for an ellipse with half-axes a, b: the circle's polygon stretched, which keeps its area
 * exact. `phase` is measured on the circle before stretching.
 */
export function ellipseOutline(a: number, b: number, facets: number, phase: number): Vec2[] {
  const factor = areaPreservingFactor(facets);
  return Array.from({ length: facets }, (_, i) => {
    const angle = phase + (2 * Math.PI * i) / facets;
    return [a * factor * Math.cos(angle), b * factor * Math.sin(angle)] as const;
  });
}

/**
 * Where the first corner of a round solid stands, radians in the plane normal to its axis: below the
 * first of the tank's directions −z, x (given in the own frame) that is not along the axis. The same
 * surface met from two solids then has the same facets, and a lying cylinder a corner at its lowest line.
 */
export function facetPhase(axis: Axis, tankX: Vec3, tankZ: Vec3): number {
  const [first, second] = axisOrder(axis);
  for (const direction of [[-tankZ[0], -tankZ[1], -tankZ[2]] as Vec3, tankX]) {
    const a = direction[first]!;
    const b = direction[second]!;
    if (Math.hypot(a, b) > 1e-6) return Math.atan2(b, a);
  }
  return 0;
}
