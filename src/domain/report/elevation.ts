import type { TankMesh } from '../table/preview';

/** From the side: looking along +y, x to the right. From the end: looking along −x, y to the right. */
export type View = 'side' | 'end';

export interface Elevation {
  view: View;
  minX: number;
  maxX: number;
  minY: number;
  maxY: number;
  /** Coordinate along the line of sight of what lies nearest to the eye (a y, or an x). */
  nearest: number;
  /** Share of the frame that the tank covers, 0…1. */
  filled: number;
  lines: readonly { x1: number; y1: number; x2: number; y2: number; hidden: boolean }[];
}

/** Faces that meet at less than this are one curved face: no line is drawn between them. */
const creaseCos = Math.cos((25 * Math.PI) / 180);
/** Cells of the coarse picture that tells how much of the frame is covered. */
const cells = 48;

/**
 * Edges of a closed mesh as a draughtsman draws them: outlines and creases, in millimetres of the
 * tank's frame; those behind another face are marked hidden. Good for a sketch, not for measuring:
 * an edge is hidden or seen as a whole, by its middle.
 */
export function elevation({ positions, triangles }: TankMesh, view: View): Elevation {
  const [ax, sight, towards] = view === 'side' ? [0, 1, 1] : [1, 0, -1];
  const at = (vertex: number): [number, number, number] => [
    positions[3 * vertex + ax]!,
    positions[3 * vertex + 2]!,
    // distance from the eye grows
    positions[3 * vertex + sight]! * towards,
  ];
  const faces: Face[] = [];
  for (let t = 0; t < triangles.length; t += 3) {
    const corners = [triangles[t]!, triangles[t + 1]!, triangles[t + 2]!] as const;
    faces.push(face(corners.map(at) as [Point, Point, Point], corners));
  }
  const xs = faces.flatMap(({ p }) => p.map(([x]) => x));
  const ys = faces.flatMap(({ p }) => p.map(([, y]) => y));
  const depths = faces.flatMap(({ p }) => p.map(([, , d]) => d));
  const frame = {
    minX: least(xs),
    maxX: -least(xs.map(negate)),
    minY: least(ys),
    maxY: -least(ys.map(negate)),
  };
  const front = faces.filter(({ facing }) => facing < 0);
  const before = gridOf(front, frame);
  return {
    view,
    ...frame,
    nearest: least(depths) * towards,
    filled: coverage(front, frame),
    lines: once(
      edgesOf(faces).map(([a, b]) => ({
        x1: a[0],
        y1: a[1],
        x2: b[0],
        y2: b[1],
        hidden: isHidden([(a[0] + b[0]) / 2, (a[1] + b[1]) / 2, (a[2] + b[2]) / 2], before),
      })),
    ),
  };
}

type Point = [number, number, number];
type Line = Elevation['lines'][number];
interface Frame {
  minX: number;
  maxX: number;
  minY: number;
  maxY: number;
}
interface Face {
  p: [Point, Point, Point];
  corners: readonly [number, number, number];
  normal: Point;
  /** Part of the unit normal along the line of sight: below 0 it faces the eye. */
  facing: number;
}

function face(p: [Point, Point, Point], corners: readonly [number, number, number]): Face {
  const [a, b, c] = p;
  const u = [b[0] - a[0], b[1] - a[1], b[2] - a[2]];
  const v = [c[0] - a[0], c[1] - a[1], c[2] - a[2]];
  // the view's axes are left-handed: the outward normal is the other way round
  const n: Point = [
    u[2]! * v[1]! - u[1]! * v[2]!,
    u[0]! * v[2]! - u[2]! * v[0]!,
    u[1]! * v[0]! - u[0]! * v[1]!,
  ];
  const size = Math.hypot(...n) || 1;
  const normal: Point = [n[0] / size, n[1] / size, n[2] / size];
  return { p, corners, normal, facing: Math.abs(normal[2]) < 1e-9 ? 0 : normal[2] };
}

/** Edges between faces that turn away from each other: outlines and creases. */
function edgesOf(faces: readonly Face[]): [Point, Point][] {
  const met = new Map<string, Face>();
  const edges: [Point, Point][] = [];
  for (const one of faces) {
    for (let i = 0; i < 3; i += 1) {
      const j = (i + 1) % 3;
      const [a, b] = [one.corners[i]!, one.corners[j]!];
      const key = a < b ? `${a} ${b}` : `${b} ${a}`;
      const other = met.get(key);
      if (other === undefined) met.set(key, one);
      else if (isEdge(one, other)) edges.push([one.p[i]!, one.p[j]!]);
    }
  }
  return edges;
}

function isEdge(one: Face, other: Face): boolean {
  const [a, b] = [one.normal, other.normal];
  if (a[0] * b[0] + a[1] * b[1] + a[2] * b[2] < creaseCos) return true;
  return one.facing < 0 !== other.facing < 0;
}

/** A line seen and the same line hidden behind it are one; points are none. */
function once(lines: readonly Line[]): Line[] {
  const kept = new Map<string, Line>();
  for (const line of lines) {
    if (Math.hypot(line.x2 - line.x1, line.y2 - line.y1) < 1e-3) continue;
    const ends = [place(line.x1, line.y1), place(line.x2, line.y2)].sort();
    const key = ends.join(' ');
    if (!kept.get(key) || !line.hidden) kept.set(key, line);
  }
  return [...kept.values()];
}

function place(x: number, y: number): string {
  return `${Math.round(x * 100)},${Math.round(y * 100)}`;
}

function isHidden([x, y, depth]: Point, before: FaceGrid): boolean {
  return before(x, y).some(({ p }) => {
    const inside = depthInside(p, x, y);
    return inside !== null && inside < depth - 0.01;
  });
}

/** Depth of a triangle at a point that lies inside it, seen from the eye; null outside or on its rim. */
function depthInside([a, b, c]: Face['p'], x: number, y: number): number | null {
  const area = (b[0] - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (b[1] - a[1]);
  if (Math.abs(area) < 1e-9) return null;
  const u = ((b[0] - x) * (c[1] - y) - (c[0] - x) * (b[1] - y)) / area;
  const v = ((c[0] - x) * (a[1] - y) - (a[0] - x) * (c[1] - y)) / area;
  const w = 1 - u - v;
  return u > 1e-6 && v > 1e-6 && w > 1e-6 ? u * a[2] + v * b[2] + w * c[2] : null;
}

/** The faces that may lie over a point of the frame. */
type FaceGrid = (x: number, y: number) => readonly Face[];

/** Faces sorted by the cells of the frame that they touch, so that an edge is held against few. */
function gridOf(front: readonly Face[], { minX, maxX, minY, maxY }: Frame): FaceGrid {
  const grid = Array.from({ length: cells * cells }, (): Face[] => []);
  const [stepX, stepY] = [(maxX - minX) / cells, (maxY - minY) / cells];
  for (const one of front) {
    const columns = span(one.p.map(([x]) => (x - minX) / stepX));
    const rows = span(one.p.map(([, y]) => (y - minY) / stepY));
    for (let row = rows.first; row <= rows.last; row += 1) {
      for (let column = columns.first; column <= columns.last; column += 1) {
        grid[row * cells + column]!.push(one);
      }
    }
  }
  const cell = (value: number) => Math.min(cells - 1, Math.max(0, Math.floor(value)));
  return (x, y) => grid[cell((y - minY) / stepY) * cells + cell((x - minX) / stepX)]!;
}

/** Share of the frame that the faces cover, on a coarse grid. */
function coverage(front: readonly Face[], { minX, maxX, minY, maxY }: Frame): number {
  const covered = new Uint8Array(cells * cells);
  const [stepX, stepY] = [(maxX - minX) / cells, (maxY - minY) / cells];
  for (const { p } of front) {
    const columns = span(p.map(([x]) => (x - minX) / stepX));
    const rows = span(p.map(([, y]) => (y - minY) / stepY));
    for (let row = rows.first; row <= rows.last; row += 1) {
      for (let column = columns.first; column <= columns.last; column += 1) {
        // a hair off the middle, so that no diagonal of the mesh runs through it
        const [x, y] = [minX + (column + 0.503) * stepX, minY + (row + 0.497) * stepY];
        if (depthInside(p, x, y) !== null) covered[row * cells + column] = 1;
      }
    }
  }
  return covered.reduce((sum, cell) => sum + cell, 0) / covered.length;
}

function span(values: readonly number[]): { first: number; last: number } {
  return {
    first: Math.max(0, Math.floor(Math.min(...values) - 0.5)),
    last: Math.min(cells - 1, Math.ceil(Math.max(...values))),
  };
}

function least(values: readonly number[]): number {
  return values.reduce((low, value) => Math.min(low, value), Infinity);
}

function negate(value: number): number {
  return -value;
}
