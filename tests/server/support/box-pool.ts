import { invalid } from '~/domain/errors';
import { sketchOf } from '~/domain/report/sketch';
import type { KeptRow, TableRow } from '~/domain/table/request';
import type { TankDocument } from '~/domain/tank/document';
import type { ComputePool } from '~/server/jobs/compute-pool';
import { acceptMesh } from '~/server/jobs/mesh-work';

/**
 * Tables of a single upright box by closed form, V = length × width × depth, without threads: for
 * tests of what stands around the geometry. Refuses everything else.
 */
export function boxPool(): ComputePool {
  return {
    async table(design, readings) {
      const { areaMm2, heightMm } = boxOf(design);
      const depths = 'atMm' in readings ? readings.atMm : stepped(heightMm, readings.stepMm);
      return {
        ...totals(areaMm2, heightMm),
        rows: depths.map((depthMm) => rowAt(areaMm2, depthMm)),
      };
    },
    async issue(design, _settings, stepMm) {
      const { areaMm2, heightMm } = boxOf(design);
      const table = {
        ...totals(areaMm2, heightMm),
        rows: stepped(heightMm, stepMm).map((depthMm) => rowAt(areaMm2, depthMm)),
      };
      return { table, rows: table.rows.map(withPlusMinus), brimPlusMinusL: 0.25 };
    },
    async sketch(design) {
      const { length, width, height } = boxOf(design);
      const corner = (i: number) => [i & 1 ? length : 0, i & 2 ? width : 0, i & 4 ? height : 0];
      const space = {
        positions: Float64Array.from([0, 1, 2, 3, 4, 5, 6, 7].flatMap(corner)),
        triangles: Uint32Array.from(boxTriangles),
      };
      const frame = {
        up: [0, 0, 1] as const,
        zeroLevelMm: 0,
        levelPerReading: 1,
        heightMm: height,
        stick: null,
        lowestLevelMm: 0,
        highestLevelMm: height,
      };
      return sketchOf(space, frame);
    },
    mesh: acceptMesh,
    async close() {},
  };
}

/** Outward, over the corners in the order of their bits x, y, z. */
const boxTriangles = [
  0, 2, 1, 1, 2, 3, 4, 5, 6, 5, 7, 6, 0, 1, 4, 1, 5, 4, 2, 6, 3, 3, 6, 7, 0, 4, 2, 2, 4, 6, 1, 3, 5,
  3, 7, 5,
];

function boxOf(design: TankDocument) {
  const [solid, another] = design.solids;
  if (solid?.kind !== 'box' || another !== undefined) {
    throw invalid('/solids', 'This test pool computes one box only.');
  }
  const { length, width, height } = solid;
  return { length, width, height, areaMm2: length * width, heightMm: height };
}

function stepped(heightMm: number, stepMm: number): number[] {
  const count = Math.ceil(heightMm / stepMm - 1e-9);
  return [...Array.from({ length: count }, (_, index) => index * stepMm), heightMm];
}

function totals(areaMm2: number, heightMm: number) {
  return {
    capacityL: (areaMm2 * heightMm) / 1e6,
    heightMm,
    errorL: 0,
    triangles: 12,
    undrainableL: 0,
    trappedL: 0,
  };
}

function rowAt(areaMm2: number, depthMm: number): TableRow {
  return {
    depthMm,
    volumeL: (areaMm2 * depthMm) / 1e6,
    surfaceCm2: areaMm2 / 100,
    centroidMm: [0, 0, depthMm / 2],
  };
}

/** The dip's ± of 2 mm alone. */
function withPlusMinus({ depthMm, volumeL, surfaceCm2 }: TableRow): KeptRow {
  return { depthMm, volumeL, surfaceCm2, plusMinusL: 2 * surfaceCm2 * 1e-4, betweenRows: false };
}
