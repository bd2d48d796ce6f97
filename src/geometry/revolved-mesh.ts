import { areaPreservingFactor } from './circle';
import type { Mesh } from './mesh';
import { axisOrder, type Shape } from './shape';

/**
 * The closed mesh of a turned profile in the own frame, mm: every point of the profile a ring of `facets`
 * corners, moved out so that its polygon keeps the circle's area, or one vertex on the axis. The profile
 * begins and ends on the axis, or else is closed along it.
 */
export function revolvedMesh(shape: Extract<Shape, { form: 'revolution' }>): Mesh {
  const { axis, facets, phase, stretch } = shape;
  const profile = fromAxisToAxis(shape.profile);
  const [first, second, third] = axisOrder(axis);
  const factor = areaPreservingFactor(facets);
  const cos = new Float64Array(facets);
  const sin = new Float64Array(facets);
  for (let i = 0; i < facets; i += 1) {
    const angle = phase + (2 * Math.PI * i) / facets;
    cos[i] = factor * Math.cos(angle);
    sin[i] = factor * Math.sin(angle);
  }
  const rings = profile.length;
  const starts = new Uint32Array(rings);
  let count = 0;
  profile.forEach(([radius], ring) => {
    starts[ring] = count;
    count += radius === 0 ? 1 : facets;
  });
  const positions = new Float64Array(3 * count);
  profile.forEach(([radius, place], ring) => {
    const corners = radius === 0 ? 1 : facets;
    for (let i = 0; i < corners; i += 1) {
      const at = 3 * (starts[ring]! + i);
      positions[at + first] = radius * cos[i]! * stretch[first];
      positions[at + second] = radius * sin[i]! * stretch[second];
      positions[at + third] = place * stretch[third];
    }
  });

  const triangles = new Uint32Array(6 * facets * (rings - 1));
  let filled = 0;
  const add = (i: number, j: number, k: number) => {
    triangles[filled] = i;
    triangles[filled + 1] = j;
    triangles[filled + 2] = k;
    filled += 3;
  };
  for (let ring = 0; ring + 1 < rings; ring += 1) {
    const low = starts[ring]!;
    const high = starts[ring + 1]!;
    const lowIsPoint = profile[ring]![0] === 0;
    const highIsPoint = profile[ring + 1]![0] === 0;
    for (let i = 0; i < facets; i += 1) {
      const j = i + 1 === facets ? 0 : i + 1;
      if (!lowIsPoint) add(low + i, low + j, highIsPoint ? high : high + j);
      if (!highIsPoint) add(lowIsPoint ? low : low + i, high + j, high + i);
    }
  }
  return { positions, triangles: triangles.slice(0, filled) };
}

function fromAxisToAxis(profile: readonly (readonly [number, number])[]) {
  // begin after the stretch that runs along the axis
  const n = profile.length;
  const start = profile.findIndex(
    ([radius], i) => radius === 0 && profile[(i + n - 1) % n]![0] === 0,
  );
  if (start < 0) return profile;
  return [...profile.slice(start), ...profile.slice(0, start)];
}
