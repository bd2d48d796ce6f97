import { describe, expect, it } from 'vitest';
import { buildChart } from '~/domain/report/chart';
import type { ChartInput } from '~/domain/report/chart-input';
import type { ChartReport } from '~/domain/report/chart-report';
import {
  cisternInput,
  greyWaterInput,
  heatingOilInput,
  rowsOf,
  vHull,
  vHullInput,
} from './sample-charts';

const cell = (report: ChartReport, depth: string, key: string): string | undefined => {
  const column = report.columns.findIndex((each) => each.key === key);
  return report.rows.find(({ cells }) => cells[0] === depth)?.cells[column];
};
const options = (changes: Partial<ChartInput['options']>): ChartInput['options'] => ({
  paper: 'a4',
  length: 'mm',
  volume: 'l',
  ...changes,
});
const words = (report: ChartReport): string =>
  report.notes.flatMap(({ sentences }) => sentences).join(' ');

describe('the ± of the brim in the box at the head', () => {
  const brim = (changes: Partial<ChartInput>) =>
    buildChart(cisternInput(changes)).box.find(({ label }) => label === 'Brim, computed')
      ?.plusMinus;

  it('is that frozen with the revision, and of an older one that of its last row', () => {
    const older = buildChart(cisternInput());
    expect(brim({ brimPlusMinusL: null })).toBe(
      older.rows.at(-1)!.cells[older.columns.findIndex(({ key }) => key === 'plusMinus')],
    );
    expect(brim({ brimPlusMinusL: 7.5 })).toBe('7.5');
  });
});

describe('rows of the sloped cistern', () => {
  // closed form: 0.05 h + h²/300 up to 60 mm, 15 + 0.45 (h − 60) above
  const report = buildChart(cisternInput());

  it.each([
    ['30', '4.5', '2.2', '118.5'],
    ['60', '15.0', '12.7', '108.0'],
    ['150', '55.5', '53.2', '67.5'],
    ['300', '123.0', '120.7', '0.0'],
  ])('%s mm: %s L, usable %s, room %s', (depth, litres, usable, room) => {
    expect(cell(report, depth, 'volume')).toBe(litres);
    expect(cell(report, depth, 'usable')).toBe(usable);
    expect(cell(report, depth, 'room')).toBe(room);
  });

  it('stands every 5 mm, from 5 to the brim, with kilograms of water', () => {
    expect(report.rows).toHaveLength(60);
    expect(report.rows[0]?.cells[0]).toBe('5');
    expect(cell(report, '150', 'mass')).toBe('55'); // 55.5 × 0.998 = 55.39
  });

  it('gives every litre figure a ± that is not smaller than the computed one', () => {
    for (const row of report.rows) {
      const computed = cisternInput().rows.find(({ depthMm }) => depthMm === row.depthMm);
      expect(Number(row.cells[2])).toBeGreaterThanOrEqual(computed!.plusMinusL - 1e-9);
    }
    for (const { plusMinus } of report.box) expect(plusMinus).not.toBeNull();
  });

  it('names the four volumes apart', () => {
    expect(report.box.map(({ label, figure }) => [label, figure])).toEqual([
      ['Brim, computed', '123.0'],
      ['Safe fill, 100 % of brim', '123.0'],
      ['Unusable', '2.3'], // 0.05·20 + 400/300 = 2.33
      ['Usable', '120.7'],
    ]);
  });

  it('is the same on paper whatever fine step was issued', () => {
    const fine = buildChart({
      ...cisternInput(),
      rows: rowsOf({ heightMm: 300, volumeL: (h) => h * 0.41, surfaceCm2: () => 4100 }, 1),
    });
    expect(cell(fine, '150', 'volume')).toBe('61.5');
  });
});

describe('units of the print', () => {
  it('US gallons and inches in eighths', () => {
    const report = buildChart(vHullInput({ options: options({ length: 'in', volume: 'usgal' }) }));
    // 0.00072 · (10 · 25.4)² / 3.785411784 = 12.271
    expect(cell(report, '10', 'volume')).toBe('12.3');
    // 0.00072 · (10.25 · 25.4)² / 3.785411784 = 12.892
    expect(cell(report, '10 2/8', 'volume')).toBe('12.9');
    expect(report.rows.at(-1)?.cells[0]).toBe('brim');
    expect(report.rows.at(-1)?.cells[1]).toBe('47.6'); // 180 / 3.785411784
    expect([report.lengthWords, report.volumeWords]).toEqual(['inches and eighths', 'US gallons']);
    expect(report.columns[1]?.head).toBe('US gal');
    expect(report.box.map(({ unit }) => unit)).toEqual(['US gal', 'US gal', 'US gal', 'US gal']);
  });

  it('imperial gallons and centimetres', () => {
    const report = buildChart(
      heatingOilInput({ options: options({ length: 'cm', volume: 'impgal' }) }),
    );
    expect(report.volumeWords).toBe('imperial gallons');
    expect(cell(report, '60', 'volume')).toBe('248.8'); // half of 2261.947 / 4.54609
    expect(report.rows).toHaveLength(120);
    expect(JSON.stringify(report)).not.toMatch(/\d\u00a0?gal/);
  });

  it('no bare "gal" stands anywhere', () => {
    for (const volume of ['usgal', 'impgal'] as const) {
      const text = JSON.stringify(buildChart(vHullInput({ options: options({ volume }) })));
      expect(text.match(/(?<!US |imp )gal(?!lon)/g)).toBeNull();
      expect(text.match(/(?<!US |imperial )gallon/g)).toBeNull();
    }
  });

  it('half centimetres show their decimal in every row', () => {
    const report = buildChart(cisternInput({ options: options({ length: 'cm' }) }));
    expect(cell(report, '15.0', 'volume')).toBe('55.5');
    expect(cell(report, '3.0', 'volume')).toBe('4.5');
  });
});

describe('marks worth knowing', () => {
  it('half and quarter of the litres of a V hull, safe fill and outlet', () => {
    const { marks } = buildChart(vHullInput()).stick;
    const at = (word: string): number => marks.find((mark) => mark.word === word)!.depthMm;
    // √(V / 0.00072), by hand
    expect(at('half')).toBeCloseTo(353.6, 1);
    expect(at('quarter')).toBeCloseTo(250, 3);
    expect(at('safe fill')).toBeCloseTo(487.3, 1);
    expect(at('outlet')).toBe(40);
  });

  it('safe fill is a mark at or below its level, the outlet one at or above', () => {
    for (const length of ['mm', 'cm', 'in'] as const) {
      const { marks } = buildChart(vHullInput({ options: options({ length }) })).stick;
      const reading = (word: string): string => marks.find((mark) => mark.word === word)!.reading;
      expect(reading('safe fill')).toBe(
        { mm: '487\u00a0mm', cm: '48.7\u00a0cm', in: '19 1/8\u00a0in' }[length],
      );
      expect(reading('outlet')).toBe(
        { mm: '40\u00a0mm', cm: '4.0\u00a0cm', in: '1 5/8\u00a0in' }[length],
      );
    }
  });

  it('regions: unusable below the outlet, headroom above safe fill', () => {
    const report = buildChart(vHullInput());
    const region = (depthMm: number): string | undefined =>
      report.rows.find((row) => row.depthMm === depthMm)?.region;
    expect([40, 50, 480, 490].map(region)).toEqual(['unusable', 'usable', 'usable', 'headroom']);
    expect(cell(report, '490', 'room')).toBe('over');
    expect(words(report)).toMatch(/“over”: above safe fill\./);
    expect(cell(report, '40', 'usable')).toBe('0.0');
  });
});

describe('waste', () => {
  it('shows room first, and safe fill before the brim', () => {
    const report = buildChart(greyWaterInput());
    expect(report.columns.map(({ key }) => key)).toEqual([
      'depth',
      'room',
      'volume',
      'plusMinus',
      'usable',
      'mass',
    ]);
    expect(report.box[0]?.label).toBe('Safe fill, 90 % of brim');
  });

  it('says that no outlet height is known instead of a 0', () => {
    const unusable = buildChart(greyWaterInput()).box.find(({ label }) => label === 'Unusable');
    expect(unusable).toMatchObject({
      figure: 'not known',
      plusMinus: null,
      detail: 'no outlet height given',
    });
  });
});

describe('words of the print', () => {
  it('method, interval, dip, cautions and the trade sentence', () => {
    const report = buildChart(vHullInput());
    expect(words(report)).toMatch(
      /Computed from inside sizes by tape, each ±\u00a02\u00a0mm; not metered\./,
    );
    const { settings, design } = vHullInput();
    const own = { [`${design.solids[0]!.id}/length`]: 1, 'gone/length': 1 };
    expect(
      words(buildChart(vHullInput({ settings: { ...settings, ownSizePlusMinusMm: own } }))),
    ).toMatch(/each ±\u00a02\u00a0mm, 1 with its own; not metered\./);
    expect(words(report)).toMatch(
      /± is a 95\u00a0% interval\. .* holds for a dip read to ±\u00a02\u00a0mm\./,
    );
    expect(words(report)).toMatch(/Computing itself adds less than 0\.001\u00a0L\./);
    expect(words(report)).toMatch(/standing level/);
    expect(words(report)).toMatch(/Reference height, zero to the rim of the dip hole: 512\u00a0mm/);
    expect(words(report)).toMatch(/No flame/);
    expect(words(report)).toMatch(/Note of this revision: Outlet pipe shortened/);
    expect(report.trade).toMatch(/^Not for trade/);
    expect(report.notes[0]).toMatchObject({ title: 'Take care', caution: true });
  });

  it('where to dip, from what the sketch shows', () => {
    expect(words(buildChart(cisternInput()))).toMatch(
      /Dip point: 50\u00a0mm from the left of the sketch, 250\u00a0mm from its near side\./,
    );
    expect(words(buildChart(greyWaterInput()))).toMatch(
      /Dip point: 160\u00a0mm from the left of the sketch, 400\u00a0mm from its near end\./,
    );
  });

  it('how it stands when it does not stand level', () => {
    const input = cisternInput();
    const report = buildChart({
      ...input,
      design: { ...input.design, attitude: { pitch: 2, roll: -1.5 } },
    });
    expect(words(report)).toMatch(
      /standing with its right end 2° lower and its near side 1\.5° lower/,
    );
  });

  it('a tilted tank holds more than its stick: the last row is no brim', () => {
    const input = cisternInput();
    const report = buildChart({
      ...input,
      capacityL: 125,
      heightMm: 298,
      rows: rowsOf({ heightMm: 298, volumeL: (h) => 2 + h * 0.41, surfaceCm2: () => 4100 }, 5),
    });
    expect(report.rows.at(-1)?.cells[0]).toBe('top');
    expect(report.rows[0]?.cells.slice(0, 2)).toEqual(['0', '2.0']);
    expect(report.box.find(({ label }) => label.startsWith('Safe fill'))?.detail).toBe(
      'above the reach of the stick',
    );
  });

  it('revision, date, what it replaces, its code', () => {
    const texts = buildChart(vHullInput()).titleBlock;
    expect(texts).toEqual([
      { label: 'Tank', text: 'Port diesel tank' },
      { label: 'Boat', text: 'Workboat Skua' },
      { label: 'Workshop', text: 'Tarnside Outfitters' },
      { label: 'Revision', text: 'B, replaces A' },
      { label: 'Issued', text: '14 November 2026, Idris Vaughan' },
      { label: 'Table code', text: '3f9a 22c1' },
    ]);
  });

  it('an old print says so', () => {
    const base = vHullInput();
    expect(buildChart(base).superseded).toBeNull();
    const old = buildChart({ ...base, revision: { ...base.revision, current: false } });
    expect(old.superseded).toMatch(/Superseded: a later revision than B stands/);
  });

  it('outside sizes are said to be so', () => {
    const input = vHullInput();
    const report = buildChart({
      ...input,
      design: { ...input.design, wall: { thickness: 6, sizes: 'outside' } },
    });
    expect(words(report)).toMatch(/Computed from outside sizes less the wall/);
  });
});

describe('a liquid of no known density', () => {
  it('has no kilograms, and the print says so', () => {
    const base = vHullInput();
    const report = buildChart({ ...base, settings: { ...base.settings, liquid: 'other' } });
    expect(report.columns.map(({ key }) => key)).not.toContain('mass');
    expect(report.rows.every(({ cells }) => cells.length === report.columns.length)).toBe(true);
    expect(report.box[0]?.detail).toBe('weight not known');
    expect(words(report)).toMatch(/Kilograms are not known/);
  });
});

describe('strong rows', () => {
  it.each([
    ['mm', 10, 5],
    ['in', 3.175, 8],
    ['in', 6.35, 4],
    ['in', 12.7, 4],
    ['in', 25.4, 4],
  ] as const)('%s by %d mm: every %d rows', (length, stepMm, group) => {
    const report = buildChart(vHullInput({ options: options({ length, stepMm }) }));
    expect(report.rowGroup).toBe(group);
    const strong = report.rows.findIndex((row) => row.strong);
    expect(strong).toBe(group - 1);
  });
});

describe('digits', () => {
  it('follow the largest ± of the rows', () => {
    const rows = rowsOf(vHull, 5);
    const rough = rows.map((row) => ({ ...row, plusMinusL: row.plusMinusL * 3 }));
    expect(cell(buildChart(vHullInput({ rows })), '250', 'volume')).toBe('45.0');
    expect(cell(buildChart(vHullInput({ rows: rough })), '250', 'volume')).toBe('45');
    const rougher = rows.map((row) => ({ ...row, plusMinusL: row.plusMinusL * 30 }));
    expect(cell(buildChart(vHullInput({ rows: rougher })), '250', 'volume')).toBe('50');
  });
});

describe('steps', () => {
  it('a step that gives too many rows is refused in a sentence', () => {
    const shape = { heightMm: 5000, volumeL: (h: number) => h, surfaceCm2: () => 1e4 };
    expect(() =>
      buildChart(
        vHullInput({
          heightMm: 5000,
          capacityL: 5000,
          rows: rowsOf(shape, 100),
          options: options({ stepMm: 1 }),
        }),
      ),
    ).toThrow('A chart has at most 2000 rows: choose a step of 3 mm or more.');
  });

  it('a chosen step is taken', () => {
    const report = buildChart(vHullInput({ options: options({ stepMm: 25 }) }));
    expect(report.rows.map(({ cells }) => cells[0]).slice(0, 3)).toEqual(['25', '50', '75']);
  });
});

it('warns on paper of pools that one dip does not tell of', () => {
  const input = cisternInput();
  const sketch = {
    ...input.sketch!,
    stickNotices: [{ what: 'pools', readingMm: 100, pools: 2 } as const],
  };
  expect(words(buildChart(input))).not.toContain('pools');
  expect(words(buildChart({ ...input, sketch }))).toContain(
    'Below 100\u00a0mm the liquid stands in 2 pools that do not level out',
  );
  expect(words(buildChart({ ...input, sketch, options: options({ length: 'in' }) }))).toContain(
    'Below 3 7/8\u00a0in the liquid',
  );
});
