import type { Mesh } from './mesh';
import { along, cross, dot, type Vec3 } from './vec3';

/** A re-entrant edge: its ends, and the outward normals of the faces to its left and right. */
export interface SeamEdge {
  from: number;
  to: number;
  left: Vec3;
  right: Vec3;
}

/** How far a fan reaches into the walls beside it, so that both overlap. Radians */
const overlap = 0.1;

/**
 * Corners of the round wall about a place of a re-entrant edge: one outside, then from the one along −left to the one along −right: as
 * many chords as asked, those between moved out until they keep the area of the arc; and one more at either
 * end inside the wall beside it. `left` and `right` may be longer than 1, as at a mitre.
 */
export function fanAt(left: Vec3, right: Vec3, wallMm: number, chords: number): Vec3[] {
  const cosine = dot(left, right) / Math.hypot(...left) / Math.hypot(...right);
  const angle = Math.acos(Math.max(-1, Math.min(1, cosine)));
  const step = angle / chords;
  // ½ sin δ (2 ρ + (k − 2) ρ²) = ½ φ for k chords of angle δ = φ/k and an arc of radius 1
  const target = angle / Math.sin(step);
  const k = chords - 2;
  const rho = k === 0 ? target / 2 : (Math.sqrt(1 + k * target) - 1) / k;
  const towards = (turned: number, reach: number): Vec3 => {
    const one = (-reach * wallMm * Math.sin(angle - turned)) / Math.sin(angle);
    const other = (-reach * wallMm * Math.sin(turned)) / Math.sin(angle);
    return along([one * left[0], one * left[1], one * left[2]], right, other);
  };
  const beyond = Math.min(overlap, (Math.PI - angle) / 4);
  const out = along(left, right, 1);
  const size = Math.hypot(...out);
  const apex = size > 0.1 ? wallMm / 4 / size : 0;
  return [
    [apex * out[0], apex * out[1], apex * out[2]],
    towards(-beyond, 0.99),
    ...Array.from({ length: chords + 1 }, (_, i) =>
      towards(i * step, i === 0 || i === chords ? 1 : rho),
    ),
    towards(angle + beyond, 0.99),
  ];
}

/**
 * The round wall along a run of re-entrant edges, each beginning where the last one ended, as one closed mesh;
 * null when it would turn over, as where the run bends more sharply than the wall is thick. Edges much shorter
 * than the wall, which facets that nearly meet leave behind, are drawn together with a neighbour.
 */
export function seamPiece(
  mesh: Mesh,
  run: readonly SeamEdge[],
  wallMm: number,
  chords: number,
): Mesh | null {
  let edges = [...run];
  for (;;) {
    const sections = sectionsOf(mesh, edges, wallMm, chords);
    if (!sections) return null;
    const over = edges.findIndex((edge, e) => turnsOver(mesh, edge, sections, e));
    if (over < 0) return meshOfSections(mesh, edges, sections);
    const drawn = withoutShort(mesh, edges, over, wallMm / 2);
    if (!drawn) return null;
    edges = drawn;
  }
}

function closed(run: readonly SeamEdge[]): boolean {
  return run.length > 2 && run[0]!.from === run.at(-1)!.to;
}

function sectionsOf(mesh: Mesh, run: readonly SeamEdge[], wallMm: number, chords: number) {
  const round = closed(run);
  const sections: Vec3[][] = [];
  for (let s = 0; s < run.length + (round ? 0 : 1); s += 1) {
    const before = run[s - 1] ?? (round ? run.at(-1)! : run[s]!);
    const after = run[s] ?? before;
    const left = mitre(before.left, after.left);
    const right = mitre(before.right, after.right);
    if (!left || !right) return null;
    const place = placeOf(mesh, s < run.length ? after.from : before.to);
    sections.push(fanAt(left, right, wallMm, chords).map((d) => along(place, d, 1)));
  }
  return sections;
}

function turnsOver(mesh: Mesh, edge: SeamEdge, sections: readonly Vec3[][], e: number): boolean {
  const direction = minus(placeOf(mesh, edge.to), placeOf(mesh, edge.from));
  const next = sections[(e + 1) % sections.length]!;
  return sections[e]!.some((corner, c) => !(dot(minus(next[c]!, corner), direction) > 0));
}

/** The run with an edge and its shorter neighbour as one, when the edge is shorter than `shortMm`; else null. */
function withoutShort(
  mesh: Mesh,
  run: readonly SeamEdge[],
  e: number,
  shortMm: number,
): SeamEdge[] | null {
  const length = ({ from, to }: SeamEdge) =>
    Math.hypot(...minus(placeOf(mesh, to), placeOf(mesh, from)));
  const round = closed(run);
  const edge = run[e]!;
  if (length(edge) > shortMm || run.length < (round ? 4 : 2)) return null;
  const before = run[e - 1] ?? (round ? run.at(-1)! : undefined);
  const after = run[e + 1] ?? (round ? run[0]! : undefined);
  const other = !before || (after && length(after) < length(before)) ? after! : before;
  const longer = length(other) > length(edge) ? other : edge;
  const whole =
    other === before
      ? { ...longer, from: other.from, to: edge.to }
      : { ...longer, from: edge.from, to: other.to };
  return run.flatMap((one) => (one === edge ? [] : one === other ? [whole] : [one]));
}

function meshOfSections(mesh: Mesh, run: readonly SeamEdge[], sections: readonly Vec3[][]): Mesh {
  const corners = sections[0]!.length;
  const [apex, first, last] = [sections[0]![0]!, sections[0]![1]!, sections[0]![corners - 1]!];
  const ahead = minus(placeOf(mesh, run[0]!.to), placeOf(mesh, run[0]!.from));
  const forward = dot(cross(minus(first, apex), minus(last, apex)), ahead) > 0;
  const triangles: number[] = [];
  const add = (i: number, j: number, k: number) =>
    forward ? triangles.push(i, j, k) : triangles.push(i, k, j);
  for (let e = 0; e < run.length; e += 1) {
    const [here, there] = [e * corners, ((e + 1) % sections.length) * corners];
    for (let c = 0; c < corners; c += 1) {
      const d = (c + 1) % corners;
      add(here + c, here + d, there + d);
      add(here + c, there + d, there + c);
    }
  }
  if (sections.length > run.length) {
    const end = run.length * corners;
    for (let c = 1; c + 1 < corners; c += 1) {
      add(0, c + 1, c);
      add(end, end + c, end + c + 1);
    }
  }
  return {
    positions: Float64Array.from(sections.flat(2)),
    triangles: Uint32Array.from(triangles),
  };
}

/** The shortest d with n·d = 1 for both normals; null where they turn more than 120° apart. */
function mitre(one: Vec3, other: Vec3): Vec3 | null {
  if (one === other) return one;
  const scale = 1 / (1 + dot(one, other));
  if (!(scale > 0 && scale < 2)) return null;
  return [scale * (one[0] + other[0]), scale * (one[1] + other[1]), scale * (one[2] + other[2])];
}

function placeOf({ positions }: Mesh, vertex: number): Vec3 {
  return [positions[3 * vertex]!, positions[3 * vertex + 1]!, positions[3 * vertex + 2]!];
}

function minus(a: Vec3, b: Vec3): Vec3 {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
}
