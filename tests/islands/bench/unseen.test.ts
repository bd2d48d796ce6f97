import { describe, expect, it } from 'vitest';
import { unseenWords } from '~/islands/bench/unseen';
import { curveFromRows } from '~/domain/table/curve';
import type { DipTable } from '~/domain/table/answer-at';

/** A box with a floor of 1 m² whose stick covers only a part of its 100 mm. */
function box(fromMm: number, toMm: number): DipTable {
  const rows = [fromMm, toMm].map((levelMm) => ({
    depthMm: levelMm - fromMm,
    volumeL: levelMm,
    surfaceCm2: 10_000,
  }));
  return {
    curve: curveFromRows(rows, 1),
    plusMinusL: [1, 1],
    heightMm: toMm - fromMm,
    capacityL: 100,
    settings: {
      liquid: 'diesel',
      densityKgPerM3: null,
      safeFillPercent: 95,
      outletMm: null,
      referenceHeightMm: null,
      measuredBy: 'tape',
      sizePlusMinusMm: 2,
      dipPlusMinusMm: 2,
    },
  };
}
const plain = (text: string | null) => text?.replace(/[\u00a0\u202f]/g, ' ');

describe('what the stick does not see', () => {
  it('says nothing where it sees all', () => {
    expect(unseenWords(box(0, 100), 'l')).toBeNull();
  });

  it('tells the litres below its zero and above its end', () => {
    expect(plain(unseenWords(box(20, 100), 'l'))).toMatch(/: 20\.0 ± 1\.0 L lie below its zero\./);
    expect(plain(unseenWords(box(0, 70), 'l'))).toMatch(/: 30\.0 ± 1\.0 L above its end\./);
  });
});
