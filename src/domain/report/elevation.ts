import type { TankMesh } from '../table/preview';
import { joinedParts, partsBetween, partWhere, type Part } from './covered-parts';
import { edgesOf, facesOf, type Edge, type Face, type Point } from './drawn-faces';
import { cells, FrameGrid, span, type Frame } from './frame-grid';
import { linesOnce, partOf, type DrawnLine } from './lines-once';

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
  /** What runs on from a line follows it. */
  lines: readonly DrawnLine[];
}

/** Nearer by less than this is on the same face. mm */
const depthSlackMm = 0.01;
/** Of the frame's size: lines nearer than this lie on each other. */
const nearShare = 1e-4;
/** Of the frame's size: the shortest part of an edge that is told apart as hidden or seen. */
const leastShare = 1e-3;

/**
 * Edges of a closed mesh as a draughtsman draws them: outlines and creases, in millimetres of the
 * tank's frame, each parted where a face begins or ceases to hide it. Good for a sketch, not for measuring.
 */
export function elevation(mesh: TankMesh, view: View): Elevation {
  const { positions } = mesh;
  const [across, sight, towards] = view === 'side' ? [0, 1, 1] : [1, 0, -1];
  const faces = facesOf(mesh, (vertex) => [
    positions[3 * vertex + across]!,
    positions[3 * vertex + 2]!,
    // distance from the eye grows
    positions[3 * vertex + sight]! * towards,
  ]);
  const { frame, nearest } = sizesOf(faces);
  const size = Math.max(frame.maxX - frame.minX, frame.maxY - frame.minY);
  const front = faces.filter(({ facing }) => facing < 0);
  const before = new FrameGrid<Face>(frame);
  for (const one of front) before.addBox(one, one.p);
  const lines = edgesOf(faces).flatMap((edge) => parted(edge, before, leastShare * size));
  return {
    view,
    ...frame,
    nearest: nearest * towards,
    filled: coverage(front, frame),
    lines: linesOnce(lines, frame, nearShare * size),
  };
}

function sizesOf(faces: readonly Face[]): { frame: Frame; nearest: number } {
  const frame = { minX: Infinity, maxX: -Infinity, minY: Infinity, maxY: -Infinity };
  let nearest = Infinity;
  for (const { box } of faces) {
    frame.minX = Math.min(frame.minX, box.minX);
    frame.maxX = Math.max(frame.maxX, box.maxX);
    frame.minY = Math.min(frame.minY, box.minY);
    frame.maxY = Math.max(frame.maxY, box.maxY);
    nearest = Math.min(nearest, box.nearest);
  }
  return { frame, nearest };
}

/** An edge as lines that are hidden or seen over their whole length. */
function parted(edge: Edge, before: FrameGrid<Face>, leastMm: number): DrawnLine[] {
  const { a, b } = edge;
  const whole = { x1: a[0], y1: a[1], x2: b[0], y2: b[1], hidden: false };
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  if (length < 1e-3) return [];
  const hiding: Part[] = [];
  const reach = {
    minX: Math.min(a[0], b[0]),
    maxX: Math.max(a[0], b[0]),
    minY: Math.min(a[1], b[1]),
    maxY: Math.max(a[1], b[1]),
    farthest: Math.max(a[2], b[2]) - depthSlackMm,
  };
  for (const face of before.along(whole)) {
    const { box } = face;
    if (box.nearest >= reach.farthest || box.maxX < reach.minX || box.minX > reach.maxX) continue;
    if (box.maxY < reach.minY || box.minY > reach.maxY || isBeside(face, edge)) continue;
    const part = hiddenPart(edge, face);
    if (!part) continue;
    hiding.push(part);
    if (part[0] === 0 && part[1] === 1) break;
  }
  const hidden = joinedParts(hiding, Math.min(0.1, leastMm / length));
  return [
    ...partsBetween(hidden).map((part) => partOf(whole, part)),
    ...hidden.map((part) => ({ ...partOf(whole, part), hidden: true })),
  ];
}

/** A crease is not hidden by its own faces, the outline of a curved face by none that has a corner there. */
function isBeside(face: Face, { faces, corners, crease }: Edge): boolean {
  if (face === faces[0] || face === faces[1]) return true;
  return !crease && corners.some((corner) => face.corners.includes(corner));
}

/** Where an edge lies behind a face, its rim included; null where nowhere. */
function hiddenPart({ a, b }: Edge, { p }: Face): Part | null {
  const [start, end] = [weightsAt(p, a[0], a[1]), weightsAt(p, b[0], b[1])];
  if (!start || !end) return null;
  const depth = ([u, v, w]: Point) => u * p[0][2] + v * p[1][2] + w * p[2][2];
  return partWhere([
    ...start.map((weight, i) => [weight + 1e-9, end[i]! + 1e-9] as const),
    [a[2] - depthSlackMm - depth(start), b[2] - depthSlackMm - depth(end)],
  ]);
}

/** A place as a weighted mean of a triangle's corners; null when it is seen edge on. */
function weightsAt([a, b, c]: Face['p'], x: number, y: number): Point | null {
  const area = (b[0] - a[0]) * (c[1] - a[1]) - (c[0] - a[0]) * (b[1] - a[1]);
  if (Math.abs(area) < 1e-9) return null;
  const u = ((b[0] - x) * (c[1] - y) - (c[0] - x) * (b[1] - y)) / area;
  const v = ((c[0] - x) * (a[1] - y) - (a[0] - x) * (c[1] - y)) / area;
  return [u, v, 1 - u - v];
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
        const weights = weightsAt(p, minX + (column + 0.5) * stepX, minY + (row + 0.5) * stepY);
        if (weights?.every((weight) => weight >= 0)) covered[row * cells + column] = 1;
      }
    }
  }
  return covered.reduce((sum, cell) => sum + cell, 0) / covered.length;
}
