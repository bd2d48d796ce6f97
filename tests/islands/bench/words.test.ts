import { describe, expect, it } from 'vitest';
import type { Curve } from '~/domain/table/curve';
import { startingPoints } from '~/domain/tank/starting-points';
import { differencesOf } from '~/islands/bench/Conflict';
import { sentenceToRemember } from '~/islands/bench/remember';
import { setSize } from '~/scene/commands';

/** V = capacity · (h/H)^power, 200 even rows. */
function power(exponent: number, heightMm: number, capacityL: number): Curve {
  const steps = Array.from({ length: 201 }, (_, i) => i / 200);
  return {
    depthMm: Float64Array.from(steps, (t) => t * heightMm),
    volumeL: Float64Array.from(steps, (t) => capacityL * t ** exponent),
    slopeLPerMm: Float64Array.from(
      steps,
      (t) => (capacityL / heightMm) * exponent * t ** (exponent - 1),
    ),
  };
}

describe('the sentence to remember', () => {
  it('says that half the stick of a V hull is a quarter of the tank (V = 0.00072 h²)', () => {
    expect(sentenceToRemember(power(2, 500, 180), 500, 180)).toBe(
      'Half the stick is a quarter of the tank.',
    );
  });
  it('says half for straight sides', () => {
    expect(sentenceToRemember(power(1, 300, 135), 300, 135)).toBe(
      'Half the stick is half of the tank.',
    );
  });
  it('gives a percentage where no plain fraction is near', () => {
    expect(sentenceToRemember(power(1.15, 300, 100), 300, 100)).toBe(
      'Half the stick is 45 % of the tank.',
    );
  });
});

describe('what differs between two drafts', () => {
  it('names the solid whose size changed', () => {
    const mine = startingPoints[1]!.design;
    expect(differencesOf(mine, setSize(mine, 'ramp', ['height'], 71))).toEqual([
      'ramp: sizes, place or turn',
    ]);
  });
});
