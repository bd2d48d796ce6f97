import type { ReadingFrame, TankMesh } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';

/**
 * How the tank is looked at. All views are parallel projections, so one 3 × 3 matrix says
 * everything: its rows give right, up and towards-the-viewer of a point in the plumb frame
 * (the tank's frame turned so that up is z).
 */
export type View =
  | { name: 'end' | 'side' | 'plan' | 'away' }
  /** Turned freely: azimuth about plumb and height of the eye, degrees. */
  | { name: 'free'; azimuth: number; elevation: number };

export type Matrix3 = readonly [Vec3, Vec3, Vec3];

const recedingAngle = (32 * Math.PI) / 180;

export function viewMatrix(view: View, receding: number): Matrix3 {
  switch (view.name) {
    case 'end':
      return [
        [0, 1, 0],
        [0, 0, 1],
        [1, 0, 0],
      ];
    case 'side':
      return [
        [1, 0, 0],
        [0, 0, 1],
        [0, -1, 0],
      ];
    case 'plan':
      return [
        [1, 0, 0],
        [0, 1, 0],
        [0, 0, 1],
      ];
    case 'away':
      return [
        [1, receding * Math.cos(recedingAngle), 0],
        [0, receding * Math.sin(recedingAngle), 1],
        [0, -1, 0],
      ];
    case 'free': {
      const a = (view.azimuth * Math.PI) / 180;
      const e = (view.elevation * Math.PI) / 180;
      const [sa, ca, se, ce] = [Math.sin(a), Math.cos(a), Math.sin(e), Math.cos(e)];
      return [
        [ca, sa, 0],
        [-se * sa, se * ca, ce],
        [ce * sa, -ce * ca, se],
      ];
    }
  }
}

/** The turn that brings the unit vector `up` to z by the shortest way (Rodrigues). */
export function plumbMatrix(up: Vec3): Matrix3 {
  const [x, y, z] = up;
  const k = 1 / (1 + z);
  return [
    [1 - k * x * x, -k * x * y, -x],
    [-k * x * y, 1 - k * y * y, -y],
    [x, y, z],
  ];
}

export function times(a: Matrix3, b: Matrix3): Matrix3 {
  const row = (r: Vec3): Vec3 => [
    r[0] * b[0][0] + r[1] * b[1][0] + r[2] * b[2][0],
    r[0] * b[0][1] + r[1] * b[1][1] + r[2] * b[2][1],
    r[0] * b[0][2] + r[1] * b[1][2] + r[2] * b[2][2],
  ];
  return [row(a[0]), row(a[1]), row(a[2])];
}

export function apply(m: Matrix3, p: Vec3): [number, number, number] {
  return [
    m[0][0] * p[0] + m[0][1] * p[1] + m[0][2] * p[2],
    m[1][0] * p[0] + m[1][1] * p[1] + m[1][2] * p[2],
    m[2][0] * p[0] + m[2][1] * p[1] + m[2][2] * p[2],
  ];
}

/** The direction of sight in the tank's frame (towards the viewer): m⁻¹ · (0, 0, 1), not normed. */
export function towardsViewer(m: Matrix3): Vec3 {
  const [a, b] = [m[0], m[1]];
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}

/** Where the picture may draw, CSS px from its top left corner. */
export interface Plate {
  width: number;
  height: number;
  /** The stick's rail: a reading of 0 stands at railTop + railPx, the highest reading at railTop. */
  railTop: number;
  railPx: number;
  marginX: number;
}

/** A point of the tank on the plate: x, y in CSS px, depth towards the viewer in −1 … 1. */
export interface Projection {
  linear: Matrix3;
  offset: Vec3;
  /** True when lengths across are drawn shorter than heights, to fit the plate. */
  shortened: boolean;
  /** Rows before scaling, for facing tests. */
  towards: Vec3;
}

/**
 * Fits a view onto the plate. Upright views keep the stick's own scale, so that a level is one
 * straight line through picture, stick and table; plan and free views are fitted.
 */
export function project(mesh: TankMesh, frame: ReadingFrame, view: View, plate: Plate): Projection {
  const upright = view.name === 'end' || view.name === 'side' || view.name === 'away';
  const stickScale = plate.railPx / (frame.heightMm * frame.levelPerReading);
  const plumb = plumbMatrix(frame.up);
  const room = plate.width - 2 * plate.marginX;
  const flat = extentOf(mesh, plumb);
  const depth = flat.high[1] - flat.low[1];
  const across = flat.high[0] - flat.low[0];
  const receding = view.name === 'away' ? recede(depth, across, stickScale, plate, room) : 0;
  const m = times(viewMatrix(view, receding), plumb);
  const box = extentOf(mesh, m);
  const spanX = box.high[0] - box.low[0];
  const spanY = box.high[1] - box.low[1];
  const deep = Math.max(box.high[2] - box.low[2], 1e-9);

  const scaleY = upright
    ? stickScale
    : Math.min(stickScale, room / spanX, (plate.height - 96) / spanY);
  const scaleX = upright ? Math.min(scaleY, room / spanX) : scaleY;
  const centreX = plate.width / 2 - (scaleX * (box.low[0] + box.high[0])) / 2;
  // upright: level = zeroLevel stands at the rail's foot; a drawn-away front face keeps its height
  const frontLift = view.name === 'away' ? receding * Math.sin(recedingAngle) * flat.low[1] : 0;
  const footY = upright
    ? plate.railTop + plate.railPx + scaleY * (frame.zeroLevelMm + frontLift)
    : plate.height / 2 + (scaleY * (box.low[1] + box.high[1])) / 2;
  const scaleZ = 2 / deep;
  return {
    linear: [scaled(m[0], scaleX), scaled(m[1], -scaleY), scaled(m[2], scaleZ)],
    offset: [centreX, footY, (-scaleZ * (box.low[2] + box.high[2])) / 2],
    shortened: scaleX < 0.995 * scaleY,
    towards: towardsViewer(m),
  };
}

export function onPlate(projection: Projection, p: Vec3): [number, number] {
  const [x, y] = apply(projection.linear, p);
  return [x + projection.offset[0], y + projection.offset[1]];
}

/** How much of the depth is drawn: half, less where the plate is short of room. */
function recede(depth: number, across: number, scale: number, plate: Plate, room: number): number {
  const rise = Math.sin(recedingAngle) * depth * scale;
  const run = Math.cos(recedingAngle) * depth * Math.min(scale, room / Math.max(across, 1e-9));
  return Math.min(0.5, (plate.railTop - 26) / rise, (0.3 * room) / run);
}

function scaled(v: Vec3, by: number): Vec3 {
  return [v[0] * by, v[1] * by, v[2] * by];
}

function extentOf(mesh: TankMesh, m: Matrix3): { low: Vec3; high: Vec3 } {
  const low: [number, number, number] = [Infinity, Infinity, Infinity];
  const high: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  const { positions } = mesh;
  for (let i = 0; i < positions.length; i += 3) {
    const q = apply(m, [positions[i]!, positions[i + 1]!, positions[i + 2]!]);
    for (let axis = 0; axis < 3; axis += 1) {
      if (q[axis]! < low[axis]!) low[axis] = q[axis]!;
      if (q[axis]! > high[axis]!) high[axis] = q[axis]!;
    }
  }
  return { low, high };
}
