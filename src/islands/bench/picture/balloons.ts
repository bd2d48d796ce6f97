import type { Preview } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';
import { onPlate, type Plate, type Projection } from '~/viewport/projection';

/** A numbered balloon and the spot its leader points at, px on the plate. */
export interface Balloon {
  id: string;
  number: number;
  anchor: [number, number];
  centre: [number, number];
}

export const balloonRadius = 12;
const gap = 2 * balloonRadius + 8;

/**
 * Balloons stand in a column left or right of the drawing, on the side their solid lies on, at
 * their solid's height where that is free; leaders never cross within a column.
 */
export function balloonsOf(preview: Preview, projection: Projection, plate: Plate): Balloon[] {
  const points = preview.solids.map((solid) => onPlate(projection, middleOf(solid.positions)));
  const { left, right } = extent(preview, projection);
  const columns: Record<'left' | 'right', Balloon[]> = { left: [], right: [] };
  points.forEach((anchor, index) => {
    // the right has the flag of the wet line: only what clearly lies there stands there
    const side = anchor[0] < left + 0.56 * (right - left) ? 'left' : 'right';
    const x =
      side === 'left'
        ? Math.max(balloonRadius + 4, left - 78)
        : Math.min(plate.width - balloonRadius - 12, right + 44);
    columns[side].push({
      id: preview.solids[index]!.id,
      number: index + 1,
      anchor,
      // above its solid's middle: the wet line stands at half the stick at first
      centre: [x, anchor[1] - 26],
    });
  });
  return [...spread(columns.left, plate), ...spread(columns.right, plate)];
}

function spread(column: Balloon[], plate: Plate): Balloon[] {
  const sorted = [...column].sort((a, b) => a.centre[1] - b.centre[1]);
  const bottom = plate.height - balloonRadius - 4;
  let floor = balloonRadius + 4;
  for (const balloon of sorted) {
    balloon.centre[1] = Math.max(balloon.centre[1], floor);
    floor = balloon.centre[1] + gap;
  }
  let ceiling = bottom;
  for (const balloon of [...sorted].reverse()) {
    balloon.centre[1] = Math.min(balloon.centre[1], ceiling);
    ceiling = balloon.centre[1] - gap;
  }
  return sorted;
}

function middleOf(positions: Float64Array): Vec3 {
  const sum: [number, number, number] = [0, 0, 0];
  for (let i = 0; i < positions.length; i += 3) {
    for (let axis = 0; axis < 3; axis += 1) sum[axis]! += positions[i + axis]!;
  }
  const count = Math.max(1, positions.length / 3);
  return [sum[0] / count, sum[1] / count, sum[2] / count];
}

function extent(preview: Preview, projection: Projection): { left: number; right: number } {
  let left = Infinity;
  let right = -Infinity;
  const { positions } = preview.space;
  for (let i = 0; i < positions.length; i += 3) {
    const [x] = onPlate(projection, [positions[i]!, positions[i + 1]!, positions[i + 2]!]);
    left = Math.min(left, x);
    right = Math.max(right, x);
  }
  return { left, right };
}
