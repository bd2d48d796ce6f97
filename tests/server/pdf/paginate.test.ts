import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastRowHeight, paginate, rowHeight } from '~/server/pdf/paginate';
import { spread } from '~/server/pdf/spread';

const first = { height: 400, blocks: 2 };
const further = { height: 640, blocks: 3 };

describe('paginate', () => {
  it('keeps one page while the rows can be read', () => {
    expect(paginate(60, 5, first, further)).toEqual([[30, 30]]);
    expect(paginate(32, 5, first, further)).toEqual([[20, 12]]);
    expect(paginate(1, 5, first, further)).toEqual([[1]]);
  });

  it('begins every block below a strong row', () => {
    const [page] = paginate(200, 5, first, further);
    expect(page).toEqual([30, 30]);
  });

  it('no row is lost and none is too small, whatever the number', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 2000 }),
        fc.constantFrom(2, 4, 5, 8),
        fc.integer({ min: 150, max: 500 }),
        (rows, group, height) => {
          const room = { height, blocks: 2 };
          const pages = paginate(rows, group, room, further);
          const total = pages.flat().reduce((sum, count) => sum + count, 0);
          const heights = pages.map((blocks, index) =>
            rowHeight(blocks, index === 0 ? room : further),
          );
          return (
            total === rows &&
            pages.every((blocks) => blocks.every((count) => count > 0) && blocks.length <= 3) &&
            heights.every((each) => each >= leastRowHeight - 1e-6)
          );
        },
      ),
    );
  });
});

describe('spread', () => {
  it('leaves labels where they belong when they do not touch', () => {
    expect(spread([10, 50, 100], 20, 0, 200)).toEqual([10, 50, 100]);
  });

  it('never lets two labels touch, and stays inside where there is room', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0, max: 200, noNaN: true }), { minLength: 1, maxLength: 6 }),
        (places) => {
          const spreadOut = spread(
            [...places].sort((a, b) => a - b),
            22,
            0,
            200,
          );
          return spreadOut.every(
            (place, i) =>
              place >= -1e-9 &&
              place <= 200 + 1e-9 &&
              (i === 0 || place - spreadOut[i - 1]! >= 22 - 1e-9),
          );
        },
      ),
    );
  });
});
