import { describe, expect, it } from 'vitest';
import type { ReadingFrame } from '~/domain/table/preview';
import { plateIn } from '~/islands/bench/use-plate';

const room = { width: 800, height: 560, above: 84, below: 66, beside: 120 };
const level: ReadingFrame = {
  up: [0, 0, 1],
  zeroLevelMm: 0,
  levelPerReading: 1,
  heightMm: 300,
  stick: null,
  lowestLevelMm: 0,
  highestLevelMm: 300,
};

describe('the plate that picture and stick share', () => {
  it('gives the rail all the room when the stick sees the whole tank', () => {
    expect(plateIn(room, level)).toMatchObject({ railTop: 84, railPx: 410 });
  });

  it('keeps a tilted tank in sight that reaches below the zero and above the end', () => {
    const plate = plateIn(room, { ...level, lowestLevelMm: -60, highestLevelMm: 350 });
    const yOf = (levelMm: number) => plate.railTop + plate.railPx * (1 - levelMm / 300);
    expect(yOf(350)).toBeCloseTo(room.above, 9);
    expect(yOf(-60)).toBeCloseTo(room.height - room.below, 9);
  });
});
