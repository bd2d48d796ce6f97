import type { TankDocument } from '~/domain/tank/document';
import type { Solid } from '~/domain/tank/kinds/registry';
import { highestLevel, placedSolid } from '~/domain/tank/placed-solid';
import type { Vec3 } from '~/domain/tank/solid';

/** A tank from its side or its end, mm, x to the right and y down, as paths of its solids. */
export interface SilhouetteDrawing {
  /** minX minY width height */
  viewBox: string;
  /** Distance of hatching lines, mm. */
  hatchMm: number;
  holds: readonly string[];
  displaces: readonly string[];
}

type Point = readonly [number, number];
interface Outline {
  role: Solid['role'];
  points: readonly Point[];
  /** Lowest and highest coordinate along the line of sight. */
  sight: readonly [number, number];
}

/** Directions in which each solid is felt: right angles and 45° among them, so that boxes stay sharp. */
const directions = 360;
const cells = 24;

/**
 * The small picture of a tank: every solid's outline, exact for flat faces at whole degrees and
 * within a thousandth of its size otherwise, from the kinds' support functions (all of them convex).
 * Of side and end the one that fills less of its frame, which is the one that tells more; only what
 * is cut right through along the line of sight counts as not filled.
 */
export function silhouetteOf(design: TankDocument): SilhouetteDrawing {
  const key = JSON.stringify(design.solids);
  const known = drawn.get(key);
  if (known) return known;
  const drawing = draw(design);
  if (drawn.size >= mostDrawn) drawn.delete(drawn.keys().next().value!);
  drawn.set(key, drawing);
  return drawing;
}

/** The last drawings by their solids: a home page shows the same shapes again and again. */
const drawn = new Map<string, SilhouetteDrawing>();
const mostDrawn = 500;

function draw(design: TankDocument): SilhouetteDrawing {
  const [side, end] = [0, 1].map((axis) => view(design.solids, axis as 0 | 1)) as [View, View];
  const chosen = end.filled < side.filled - 0.02 ? end : side;
  const { frame, outlines } = chosen;
  const size = Math.max(frame.width, frame.height);
  const pad = size * 0.03;
  const paths = (role: Solid['role']) =>
    outlines.filter((o) => o.role === role).map((o) => pathOf(o.points));
  return {
    viewBox: [frame.minX - pad, frame.minY - pad, frame.width + 2 * pad, frame.height + 2 * pad]
      .map(short)
      .join(' '),
    hatchMm: size / 16,
    holds: paths('holds'),
    displaces: paths('displaces'),
  };
}

interface Frame {
  minX: number;
  minY: number;
  width: number;
  height: number;
}
interface View {
  outlines: readonly Outline[];
  frame: Frame;
  filled: number;
}

/** `across`: the axis that runs to the right, 0 = x (from the side), 1 = y (from the end). */
function view(solids: readonly Solid[], across: 0 | 1): View {
  const outlines = solids.map((solid) => outlineOf(solid, across));
  const all = outlines.filter(({ role }) => role === 'holds').flatMap(({ points }) => points);
  const xs = all.map(([x]) => x);
  const ys = all.map(([, y]) => y);
  const [minX, minY] = [Math.min(...xs), Math.min(...ys)];
  const frame = { minX, minY, width: Math.max(...xs) - minX, height: Math.max(...ys) - minY };
  return { outlines, frame, filled: filledShare(outlines, frame) };
}

/** Where neighbouring tangents meet: the corners, each once. */
function outlineOf(solid: Solid, across: 0 | 1): Outline {
  const placed = placedSolid(solid);
  const lines = Array.from({ length: directions }, (_, i) => {
    const angle = (2 * Math.PI * i) / directions;
    const [c, s] = [Math.cos(angle), Math.sin(angle)];
    return { c, s, reach: highestLevel(placed, across === 0 ? [c, 0, s] : [0, c, s]) };
  });
  const points: Point[] = [];
  lines.forEach((a, i) => {
    const b = lines[(i + 1) % directions]!;
    const det = a.c * b.s - a.s * b.c;
    const x = (a.reach * b.s - b.reach * a.s) / det;
    const z = (a.c * b.reach - b.c * a.reach) / det;
    const last = points.at(-1);
    // y runs down on the drawing
    if (last === undefined || Math.hypot(last[0] - x, last[1] + z) > 1e-6) points.push([x, -z]);
  });
  const away: Vec3 = across === 0 ? [0, 1, 0] : [1, 0, 0];
  const towards: Vec3 = across === 0 ? [0, -1, 0] : [-1, 0, 0];
  return {
    role: solid.role,
    points,
    sight: [-highestLevel(placed, towards), highestLevel(placed, away)],
  };
}

function filledShare(outlines: readonly Outline[], frame: Frame): number {
  const held = outlines.filter(({ role }) => role === 'holds');
  const low = Math.min(...held.map(({ sight }) => sight[0]));
  const high = Math.max(...held.map(({ sight }) => sight[1]));
  const slack = 0.01 * (high - low);
  const cuts = outlines.filter(
    ({ role, sight }) =>
      role === 'displaces' && sight[0] <= low + slack && sight[1] >= high - slack,
  );
  let count = 0;
  for (let i = 0; i < cells * cells; i += 1) {
    const point: Point = [
      frame.minX + (((i % cells) + 0.5) / cells) * frame.width,
      frame.minY + ((Math.floor(i / cells) + 0.5) / cells) * frame.height,
    ];
    const inside = (some: readonly Outline[]) => some.some(({ points }) => contains(points, point));
    if (inside(held) && !inside(cuts)) count += 1;
  }
  return count / (cells * cells);
}

/** Whether a convex polygon holds a point, whichever way it turns. */
function contains(polygon: readonly Point[], [x, y]: Point): boolean {
  let sign = 0;
  return polygon.every(([ax, ay], i) => {
    const [bx, by] = polygon[(i + 1) % polygon.length]!;
    const turn = Math.sign((bx - ax) * (y - ay) - (by - ay) * (x - ax));
    if (turn === 0 || sign === 0) {
      sign ||= turn;
      return true;
    }
    return turn === sign;
  });
}

function pathOf(points: readonly Point[]): string {
  return `M${points.map(([x, y]) => `${short(x)} ${short(y)}`).join('L')}Z`;
}

function short(value: number): string {
  return String(Math.round(value * 10) / 10);
}
