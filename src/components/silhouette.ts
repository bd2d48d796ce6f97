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

const cells = 24;

/**
 * The small picture of a tank: every solid's outline, from the kinds' support functions (all of them
 * convex). Of a dozen solids or fewer exact for flat faces at whole degrees and within a thousandth of its
 * size otherwise; of more, each small in the picture, within a hundredth.
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
  const felt = feelers(directionsFor(solids.length), across);
  const outlines = solids.map((solid) => outlineOf(solid, across, felt));
  const all = outlines.filter(({ role }) => role === 'holds').flatMap(({ points }) => points);
  const xs = all.map(([x]) => x);
  const ys = all.map(([, y]) => y);
  const [minX, minY] = [Math.min(...xs), Math.min(...ys)];
  const frame = { minX, minY, width: Math.max(...xs) - minX, height: Math.max(...ys) - minY };
  return { outlines, frame, filled: filledShare(outlines, frame) };
}

/**
 * Directions in which each solid is felt: right angles and 45° among them, so that boxes stay sharp. Of two
 * hundred solids a picture must still be drawn, and sent, in no time.
 */
function directionsFor(solids: number): number {
  return solids <= 12 ? 360 : solids <= 60 ? 72 : 24;
}

interface Feeler {
  c: number;
  s: number;
  up: Vec3;
}

function feelers(count: number, across: 0 | 1): Feeler[] {
  return Array.from({ length: count }, (_, i) => {
    const angle = (2 * Math.PI * i) / count;
    const [c, s] = [Math.cos(angle), Math.sin(angle)];
    return { c, s, up: across === 0 ? [c, 0, s] : [0, c, s] };
  });
}

/** Where neighbouring tangents meet: the corners, each once. */
function outlineOf(solid: Solid, across: 0 | 1, felt: readonly Feeler[]): Outline {
  const placed = placedSolid(solid);
  const reaches = felt.map(({ up }) => highestLevel(placed, up));
  const points: Point[] = [];
  felt.forEach((a, i) => {
    const next = (i + 1) % felt.length;
    const b = felt[next]!;
    const [reachA, reachB] = [reaches[i]!, reaches[next]!];
    const det = a.c * b.s - a.s * b.c;
    const x = (reachA * b.s - reachB * a.s) / det;
    const z = (a.c * reachB - b.c * reachA) / det;
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
  const [inHeld, inCut] = [covered(held, frame), covered(cuts, frame)];
  return inHeld.filter((inside, i) => inside && !inCut[i]).length / (cells * cells);
}

/** Which cells of the frame have their middle inside one of the outlines; each is held against its own few. */
function covered(some: readonly Outline[], { minX, minY, width, height }: Frame): boolean[] {
  const inside = Array.from({ length: cells * cells }, () => false);
  const [stepX, stepY] = [width / cells, height / cells];
  for (const { points } of some) {
    const columns = middlesWithin(points, 0, minX, stepX);
    const rows = middlesWithin(points, 1, minY, stepY);
    for (let row = rows.first; row <= rows.last; row += 1) {
      for (let column = columns.first; column <= columns.last; column += 1) {
        const i = row * cells + column;
        inside[i] ||= contains(points, [minX + (column + 0.5) * stepX, minY + (row + 0.5) * stepY]);
      }
    }
  }
  return inside;
}

function middlesWithin(points: readonly Point[], axis: 0 | 1, from: number, step: number) {
  const along = points.map((point) => (point[axis] - from) / step - 0.5);
  return {
    first: Math.max(0, Math.ceil(Math.min(...along) - 1e-9)),
    last: Math.min(cells - 1, Math.floor(Math.max(...along) + 1e-9)),
  };
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
