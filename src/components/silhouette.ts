import type { TankDocument } from '~/domain/tank/document';
import type { Solid } from '~/domain/tank/kinds/registry';
import { solidOutline } from '~/domain/report/solid-outline';
import { hasMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
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
  loops: readonly (readonly Point[])[];
  /** Lowest and highest coordinate along the line of sight. */
  sight: readonly [number, number];
}

const cells = 24;

/**
 * The small picture of a tank: every solid's true outline. Exact where faces are flat; of a dozen solids or fewer
 * round ones are within a thousandth of their size, of more, each small in the picture, within a hundredth.
 * Of side and end the one that fills less of its frame, which is the one that tells more; only what
 * is cut right through along the line of sight counts as not filled.
 * null where a mesh is named that this process has not loaded: a part of a tank would be a false picture.
 */
export function silhouetteOf(design: TankDocument): SilhouetteDrawing | null {
  if (design.solids.some((solid) => solid.kind === 'mesh' && !hasMesh(solid.upload))) return null;
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
    outlines.filter((o) => o.role === role).map((o) => pathOf(o.loops));
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
  const fineness = finenessFor(solids.length);
  const outlines = solids.map((solid) => outlineOf(solid, across, fineness));
  const all = outlines.filter(({ role }) => role === 'holds').flatMap(({ loops }) => loops.flat());
  const xs = all.map(([x]) => x);
  const ys = all.map(([, y]) => y);
  const [minX, minY] = [Math.min(...xs), Math.min(...ys)];
  const frame = { minX, minY, width: Math.max(...xs) - minX, height: Math.max(...ys) - minY };
  return { outlines, frame, filled: filledShare(outlines, frame) };
}

/** Of two hundred solids a picture must still be drawn, and sent, in no time. */
function finenessFor(solids: number): { directions: number; facets: number } {
  if (solids <= 12) return { directions: 360, facets: 64 };
  return solids <= 60 ? { directions: 72, facets: 32 } : { directions: 24, facets: 16 };
}

function outlineOf(solid: Solid, across: 0 | 1, fineness: ReturnType<typeof finenessFor>): Outline {
  const placed = placedSolid(solid);
  const away: Vec3 = across === 0 ? [0, 1, 0] : [1, 0, 0];
  const towards: Vec3 = across === 0 ? [0, -1, 0] : [-1, 0, 0];
  return {
    role: solid.role,
    // y runs down on the drawing
    loops: solidOutline(placed, across, fineness).map((loop) => loop.map(([x, y]) => [x, -y])),
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
  for (const { loops } of some) {
    const points = loops.flat();
    const columns = middlesWithin(points, 0, minX, stepX);
    const rows = middlesWithin(points, 1, minY, stepY);
    for (let row = rows.first; row <= rows.last; row += 1) {
      for (let column = columns.first; column <= columns.last; column += 1) {
        const i = row * cells + column;
        inside[i] ||= contains(loops, [minX + (column + 0.5) * stepX, minY + (row + 0.5) * stepY]);
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

/** Whether loops that do not cross hold a point: a ray to the right meets them an odd number of times. */
function contains(loops: readonly (readonly Point[])[], [x, y]: Point): boolean {
  let inside = false;
  for (const loop of loops) {
    loop.forEach(([ax, ay], i) => {
      const [bx, by] = loop[(i + 1) % loop.length]!;
      if (ay > y !== by > y && x < ax + ((y - ay) / (by - ay)) * (bx - ax)) inside = !inside;
    });
  }
  return inside;
}

function pathOf(loops: readonly (readonly Point[])[]): string {
  const path = (points: readonly Point[]) =>
    `M${points.map(([x, y]) => `${short(x)} ${short(y)}`).join('L')}Z`;
  return loops.map(path).join('');
}

function short(value: number): string {
  return String(Math.round(value * 10) / 10);
}
