import { arcChords, areaPreservingArc } from './area-preserving-arc';
import type { Mesh } from './mesh';
import type { RoundedBox } from './rounded-box';
import { axisOrder, type Vec2 } from './shape';

/** Corners nearer to each other than this would fall together on the snapping grid. mm */
const leastChordMm = 1e-5;

/**
 * A closed mesh of exactly the box's volume, `facets` chords to a turn: level rings, each the outline at its own
 * inset with corner arcs of exact area, along a rim arc that is moved out as a whole until the volume between the
 * rings is exact. Arcs end on the flat faces. Wants corner and rim above 0.
 */
export function roundedBoxMesh(box: RoundedBox, facets: number): Mesh {
  const [a, b, h] = box.size;
  const { corner, rim } = box;
  const arc = volumePreservingRim(box, arcChords(rim, Math.PI / 2, facets));
  const top = arc.map(([out, up]): Vec2 => [rim * (1 - out), h / 2 - rim * (1 - up)]);
  const rings = [...top.map(([inset, level]): Vec2 => [inset, -level]).reverse(), ...top];

  const smallest = corner - top.at(-1)![0];
  const most = Math.max(4, Math.floor((Math.PI * smallest) / 2 / leastChordMm));
  const quarter = areaPreservingArc(
    Math.min(arcChords(corner, Math.PI / 2, facets), most),
    Math.PI / 2,
  );
  const around = 4 * quarter.length;
  const order = axisOrder(box.axis);
  const positions = new Float64Array(3 * around * rings.length);
  rings.forEach(([inset, level], ring) => {
    for (let k = 0; k < 4; k += 1) {
      const [cos, sin] = [[1, 0, -1, 0][k]!, [0, 1, 0, -1][k]!];
      const middle = [(cos - sin) * (a / 2 - corner), (cos + sin) * (b / 2 - corner)] as const;
      quarter.forEach(([x, y], i) => {
        const at = 3 * (ring * around + k * quarter.length + i);
        positions[at + order[0]] = middle[0] + (corner - inset) * (x * cos - y * sin);
        positions[at + order[1]] = middle[1] + (corner - inset) * (x * sin + y * cos);
        positions[at + order[2]] = level;
      });
    }
  });
  return { positions, triangles: stacked(around, rings.length) };
}

/** Two triangles a side between neighbouring rings, and the two ends, which are convex. */
function stacked(around: number, rings: number): Uint32Array {
  const triangles: number[] = [];
  const last = around * (rings - 1);
  for (let i = 0; i < around; i += 1) {
    const j = (i + 1) % around;
    for (let start = 0; start < last; start += around) {
      const above = start + around;
      triangles.push(start + i, start + j, above + j, start + i, above + j, above + i);
    }
    if (i > 0 && j > 0) triangles.push(0, j, i, last, last + i, last + j);
  }
  return Uint32Array.from(triangles);
}

/**
 * The rim's quarter arc of radius 1, from the wall (1, …) up to the end (…, 1), as chords with corners at one radius
 * 1 + p, found by the secant rule. At the inset s the outline's area is A(s) = A₀ + A₁ s + π s², so between two
 * rings Simpson's rule gives the volume of the chord, and ∫ s = r² (1 − π/4) and ∫ s² = r³ (5/3 − π/2) over the arc's
 * height give that of the arc.
 */
function volumePreservingRim({ size: [a, b], corner, rim }: RoundedBox, chords: number): Vec2[] {
  const step = Math.PI / 2 / chords;
  const slope = -2 * (a + b) + (8 - 2 * Math.PI) * corner;
  // what the inset takes off the area, A₀ − A(s): no digits lost to the area itself
  const taken = (inset: number) => -slope * inset - Math.PI * inset ** 2;
  const exact = -slope * rim ** 2 * (1 - Math.PI / 4) - Math.PI * rim ** 3 * (5 / 3 - Math.PI / 2);
  const excess = (beyond: number) => {
    const points = rimPoints(beyond, chords, step);
    let volume = -exact;
    for (let i = 1; i < points.length; i += 1) {
      const [[out0, up0], [out1, up1]] = [points[i - 1]!, points[i]!];
      const [s0, s1] = [rim * (1 - out0), rim * (1 - out1)];
      volume += (rim * (up1 - up0) * (taken(s0) + 4 * taken((s0 + s1) / 2) + taken(s1))) / 6;
    }
    return volume;
  };
  // begin with the arc that preserves its own area
  let before = areaPreservingArc(chords, Math.PI / 2)[0]![1] * Math.tan(step / 2);
  let beyond = before * 1.05;
  let [was, is] = [excess(before), excess(beyond)];
  for (let turn = 0; turn < 30 && is !== 0 && is !== was; turn += 1) {
    const next = beyond - (is * (beyond - before)) / (is - was);
    [before, was, beyond] = [beyond, is, next];
    is = excess(beyond);
  }
  return rimPoints(beyond, chords, step);
}

function rimPoints(beyond: number, chords: number, step: number): Vec2[] {
  const along = beyond / Math.tan(step / 2);
  const points: Vec2[] = [[1, along]];
  for (let k = 1; k < chords; k += 1) {
    points.push([(1 + beyond) * Math.cos(k * step), (1 + beyond) * Math.sin(k * step)]);
  }
  points.push([along, 1]);
  return points;
}
