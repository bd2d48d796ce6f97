import { sketchOf } from '~/domain/report/sketch';
import type { ChartInput } from '~/domain/report/chart-input';
import type { ReadingFrame, TankMesh } from '~/domain/table/preview';
import type { IssuedRow } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { TankSettings } from '~/domain/tank/settings';

/** Tanks whose tables are closed forms: the charts are tested against sums done by hand. */

export interface Shape {
  heightMm: number;
  volumeL(h: number): number;
  surfaceCm2(h: number): number;
}

/**
 * A sloped water tank, inside 900 × 500 × 300: flat sump for 100 mm, then the floor rises 60 mm over
 * 800. Litres: 0.05 h + h²/300 up to 60 mm, 15 + 0.45 (h − 60) above.
 */
export const cistern: Shape = {
  heightMm: 300,
  volumeL: (h) => (h <= 60 ? 0.05 * h + h ** 2 / 300 : 15 + 0.45 * (h - 60)),
  surfaceCm2: (h) => (h <= 60 ? 0.05 + (2 * h) / 300 : 0.45) * 1e4,
};

/** V hull 600 wide at the top, 500 deep, 1200 long: 0.00072 h² litres. */
export const vHull: Shape = {
  heightMm: 500,
  volumeL: (h) => 0.00072 * h ** 2,
  surfaceCm2: (h) => 0.00144 * h * 1e4,
};

/** Lying cylinder with flat ends: area of a circular segment times length. */
export function lyingCylinder(diameterMm: number, lengthMm: number): Shape {
  const r = diameterMm / 2;
  return {
    heightMm: diameterMm,
    volumeL: (h) =>
      ((r * r * Math.acos((r - h) / r) - (r - h) * Math.sqrt(Math.max(0, 2 * r * h - h * h))) *
        lengthMm) /
      1e6,
    surfaceCm2: (h) => (2 * Math.sqrt(Math.max(0, 2 * r * h - h * h)) * lengthMm) / 100,
  };
}

/** Rows of a closed form; the ± as sizes of ± 0.4 % of the litres and a dip of ± 2 mm, in quadrature. */
export function rowsOf(shape: Shape, stepMm: number): IssuedRow[] {
  const rows: IssuedRow[] = [];
  for (let depthMm = 0; depthMm < shape.heightMm - 1e-9; depthMm += stepMm)
    rows.push(row(shape, depthMm));
  rows.push(row(shape, shape.heightMm));
  return rows;
}

function row(shape: Shape, depthMm: number): IssuedRow {
  const volumeL = shape.volumeL(depthMm);
  const surfaceCm2 = shape.surfaceCm2(depthMm);
  const plusMinusL = Math.hypot(0.004 * volumeL, 2 * surfaceCm2 * 1e-4);
  return { depthMm, volumeL, surfaceCm2, plusMinusL };
}

/** A polygon in one plane drawn out along the other: x–z along y, or y–z along x. Convex or fan-shaped from its first corner. */
export function prismMesh(
  profile: readonly (readonly [number, number])[],
  length: number,
  along: 'x' | 'y',
): TankMesh {
  const n = profile.length;
  const positions: number[] = [];
  for (const end of [0, length]) {
    for (const [u, z] of profile) positions.push(...(along === 'y' ? [u, end, z] : [end, u, z]));
  }
  const triangles: number[] = [];
  const put = (a: number, b: number, c: number): void => {
    triangles.push(...(along === 'y' ? [a, b, c] : [a, c, b]));
  };
  for (let i = 1; i + 1 < n; i += 1) {
    put(0, i, i + 1);
    put(n, n + i + 1, n + i);
  }
  for (let i = 0; i < n; i += 1) {
    const j = (i + 1) % n;
    put(i, n + j, j);
    put(i, n + i, n + j);
  }
  return { positions: Float64Array.from(positions), triangles: Uint32Array.from(triangles) };
}

export const circle = (r: number, corners: number): [number, number][] =>
  Array.from({ length: corners }, (_, i) => {
    const angle = (2 * Math.PI * i) / corners;
    return [r + r * Math.cos(angle), r + r * Math.sin(angle)];
  });

export function frameOf(heightMm: number, at: [number, number]): ReadingFrame {
  return {
    up: [0, 0, 1],
    zeroLevelMm: 0,
    levelPerReading: 1,
    heightMm,
    stick: { at, zeroZ: 0, roofZ: heightMm },
    lowestLevelMm: 0,
    highestLevelMm: heightMm,
  };
}

const settings: TankSettings = {
  liquid: 'drinking-water',
  densityKgPerM3: null,
  safeFillPercent: 100,
  outletMm: 20,
  referenceHeightMm: 330,
  measuredBy: 'tape',
  sizePlusMinusMm: 2,
  dipPlusMinusMm: 2,
};

const hash = '3f9a22c1'.padEnd(64, '0');

const cisternDesign: TankDocument = {
  format: 'dipwright-tank',
  version: 1,
  name: 'Hut cistern',
  solids: [
    { id: 'body', role: 'holds', kind: 'box', length: 900, width: 500, height: 300 },
    {
      id: 'ramp',
      role: 'displaces',
      kind: 'wedge',
      length: 800,
      width: 500,
      height: 60,
      at: [100, 0, 0],
      turn: [0, 0, 180],
    },
  ],
  stick: { at: [50, 250] },
};

export function cisternInput(changes: Partial<ChartInput> = {}): ChartInput {
  return {
    workshopName: 'Tarnside Outfitters',
    installation: { name: 'High Tarn hut', kind: 'place' },
    tankName: 'Drinking water cistern',
    revision: {
      letter: 'A',
      issuedAt: '2026-11-14T09:30:00.000Z',
      issuedBy: 'Idris Vaughan',
      replaces: null,
      note: null,
      hash,
      current: true,
    },
    design: cisternDesign,
    settings,
    heightMm: 300,
    levelPerReading: 1,
    capacityL: 123,
    errorL: 2e-6,
    brimPlusMinusL: null,
    rows: rowsOf(cistern, 5),
    sketch: sketchOf(
      prismMesh(
        [
          [0, 0],
          [100, 0],
          [900, 60],
          [900, 300],
          [0, 300],
        ],
        500,
        'y',
      ),
      frameOf(300, [50, 250]),
    ),
    options: { paper: 'a4', length: 'mm', volume: 'l' },
    ...changes,
  };
}

export function vHullInput(changes: Partial<ChartInput> = {}): ChartInput {
  const base = cisternInput();
  return {
    ...base,
    installation: { name: 'Workboat Skua', kind: 'boat' },
    tankName: 'Port diesel tank',
    revision: {
      ...base.revision,
      letter: 'B',
      replaces: 'A',
      note: 'Outlet pipe shortened, now 40 mm above the keel.',
    },
    design: { ...cisternDesign, name: 'V hull', stick: { at: [300, 600] } },
    settings: {
      ...settings,
      liquid: 'diesel',
      safeFillPercent: 95,
      outletMm: 40,
      referenceHeightMm: 512,
    },
    heightMm: 500,
    capacityL: 180,
    rows: rowsOf(vHull, 5),
    sketch: sketchOf(
      prismMesh(
        [
          [300, 0],
          [600, 500],
          [0, 500],
        ],
        1200,
        'y',
      ),
      frameOf(500, [300, 600]),
    ),
    ...changes,
  };
}

export function heatingOilInput(changes: Partial<ChartInput> = {}): ChartInput {
  const base = cisternInput();
  const shape = lyingCylinder(1200, 2000);
  return {
    ...base,
    tankName: 'Heating oil',
    design: { ...cisternDesign, name: 'Heating oil', stick: { at: [300, 600] } },
    settings: {
      ...settings,
      liquid: 'heating-oil',
      safeFillPercent: 97,
      outletMm: 60,
      referenceHeightMm: null,
    },
    heightMm: 1200,
    capacityL: shape.volumeL(1200),
    rows: rowsOf(shape, 5),
    sketch: sketchOf(prismMesh(circle(600, 48), 2000, 'x'), frameOf(1200, [300, 600])),
    ...changes,
  };
}

export function greyWaterInput(changes: Partial<ChartInput> = {}): ChartInput {
  const base = cisternInput();
  const shape = lyingCylinder(320, 800);
  return {
    ...base,
    installation: { name: 'Service van 7', kind: 'vehicle' },
    tankName: 'Grey water',
    design: { ...cisternDesign, name: 'Grey water', stick: { at: [400, 160] } },
    settings: {
      ...settings,
      liquid: 'grey-water',
      safeFillPercent: 90,
      outletMm: null,
      referenceHeightMm: null,
    },
    heightMm: 320,
    capacityL: shape.volumeL(320),
    rows: rowsOf(shape, 5),
    sketch: sketchOf(prismMesh(circle(160, 48), 800, 'x'), frameOf(320, [400, 160])),
    ...changes,
  };
}
