import { execFileSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { buildChart } from '~/domain/report/chart';
import type { ChartInput } from '~/domain/report/chart-input';
import { drawChart } from '~/server/pdf/draw-chart';
import {
  cisternInput,
  greyWaterInput,
  heatingOilInput,
  vHullInput,
} from '../../domain/report/sample-charts';

const folder = mkdtempSync(join(tmpdir(), 'dipwright-chart-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

let count = 0;
async function print(input: ChartInput): Promise<string> {
  const file = join(folder, `chart-${(count += 1)}.pdf`);
  writeFileSync(file, await drawChart(buildChart(input)));
  return file;
}
const run = (command: string, ...parameters: string[]): string =>
  execFileSync(command, parameters, { encoding: 'utf8' });
const textOf = (file: string): string => run('pdftotext', '-layout', file, '-');
const letters = { paper: 'letter', length: 'in', volume: 'usgal' } as const;

describe('a chart on paper', () => {
  it('holds the litres of the sloped cistern at the right rows', async () => {
    const text = textOf(await print(cisternInput()));
    for (const [depth, litres] of [
      ['30', '4.5'],
      ['60', '15.0'],
      ['150', '55.5'],
      ['300', '123.0'],
    ]) {
      expect(text).toMatch(new RegExp(`(^|\\s)${depth} +${litres!.replace('.', '\\.')} `, 'm'));
    }
    for (const words of [
      'Drinking water cistern',
      'High Tarn hut · Tarnside Outfitters',
      'depth in millimetres',
      'volume in litres',
      'A, first issue',
      '14 November 2026',
      '3f9a 22c1',
      '1 of 1',
      'Keep a stick for this tank alone.',
      'Not for trade or fiscal measurement. Local codes and licensed practice come first.',
      '± is a 95 % interval.',
      'dip point',
    ]) {
      expect(text.replaceAll('\u00a0', ' ')).toContain(words);
    }
  });

  it('embeds Source Sans 3 and nothing else', async () => {
    const fonts = run('pdffonts', await print(vHullInput()))
      .trim()
      .split('\n')
      .slice(2);
    expect(fonts.length).toBeGreaterThanOrEqual(3);
    for (const line of fonts) expect(line).toMatch(/SourceSans3.* yes yes yes /);
  });

  it('is tagged, titled and of the asked paper', async () => {
    const a4 = run('pdfinfo', await print(cisternInput()));
    expect(a4).toMatch(/Page size: +595\.28 x 841\.89 pts \(A4\)/);
    expect(a4).toMatch(/Tagged: +yes/);
    expect(a4).toMatch(/Title: +Drinking water cistern, High Tarn hut: dip chart, revision A/);
    const letter = run('pdfinfo', await print(vHullInput({ options: letters })));
    expect(letter).toMatch(/Page size: +612 x 792 pts \(letter\)/);
    const structure = run('pdfinfo', '-struct', await print(cisternInput()));
    expect(structure.match(/^ +TR$/gm)).toHaveLength(62); // 60 rows and a head for each block
  });

  it('gives the same bytes for the same revision', async () => {
    const report = buildChart(vHullInput());
    expect(Buffer.compare(await drawChart(report), await drawChart(report))).toBe(0);
  });

  it('spells gallons out and reads inches in eighths', async () => {
    const text = textOf(await print(vHullInput({ options: letters }))).replaceAll('\u00a0', ' ');
    expect(text).toContain('volume in US gallons');
    expect(text).toContain('depth in inches and eighths');
    expect(text).toMatch(/ 10 2\/8 +12\.9 /);
    expect(text).toMatch(/brim +47\.6 /);
    expect(text).toContain('1 of 2');
    expect(text).toContain('2 of 2');
  });

  it('runs over pages with the head and the title block on each', async () => {
    const file = await print(
      heatingOilInput({ options: { paper: 'a4', length: 'cm', volume: 'impgal', stepMm: 2 } }),
    );
    const pages = Number(/Pages: +(\d+)/.exec(run('pdfinfo', file))?.[1]);
    expect(pages).toBeGreaterThan(3);
    for (let page = 1; page <= pages; page += 1) {
      const text = run('pdftotext', '-layout', '-f', String(page), '-l', String(page), file, '-');
      expect(text).toContain('Heating oil');
      expect(text).toContain(`${page} of ${pages}`);
      expect(text).toContain('imperial gallons');
    }
    const depths = [...textOf(file).matchAll(/(?<=\s)(\d+\.\d)(?= +[\d.]+ +\d\.\d )/g)].map(
      ([depth]) => depth,
    );
    expect(new Set(depths).size).toBeGreaterThanOrEqual(600);
  });
});

const longName =
  'Forward starboard bilge-side reserve tank for drinking water beneath the double berth, the second of a pair';
const cases: [string, ChartInput][] = [
  ['cistern', cisternInput()],
  ['V hull, Letter', vHullInput({ options: letters })],
  ['heating oil', heatingOilInput({ options: { paper: 'a4', length: 'cm', volume: 'impgal' } })],
  ['grey water', greyWaterInput()],
  ['no sketch', cisternInput({ sketch: null })],
  [
    'long names, superseded',
    cisternInput({
      tankName: longName,
      workshopName: `Workshop of ${longName}`,
      installation: { name: `Yacht ${longName}`, kind: 'boat' },
      revision: { ...cisternInput().revision, current: false, note: longName.repeat(4) },
    }),
  ],
];

describe('no two words lie on each other and none leaves the page', () => {
  it.each(cases)('%s', async (_name, input) => {
    const file = await print(input);
    const html = run('pdftotext', '-bbox', file, '-');
    for (const page of html.split('<page ').slice(1)) {
      const [, width, height] = /width="([\d.]+)" height="([\d.]+)"/.exec(page)!.map(Number);
      const words = [
        ...page.matchAll(
          /xMin="([\d.-]+)" yMin="([\d.-]+)" xMax="([\d.-]+)" yMax="([\d.-]+)">([^<]*)</g,
        ),
      ].map(([, x1, y1, x2, y2, text]) => ({
        x1: Number(x1),
        y1: Number(y1),
        x2: Number(x2),
        y2: Number(y2),
        text: text!,
      }));
      expect(words.length).toBeGreaterThan(40);
      for (const word of words) {
        expect(word.x1, word.text).toBeGreaterThan(30);
        expect(word.x2, word.text).toBeLessThan(width! - 30);
        expect(word.y2, word.text).toBeLessThan(height! - 25);
      }
      expect(overlaps(words)).toEqual([]);
    }
  });
});

interface Word {
  x1: number;
  y1: number;
  x2: number;
  y2: number;
  text: string;
}

/** Pairs of words whose inked bands (the middle half of a line's box) cover each other. */
function overlaps(words: readonly Word[]): string[] {
  const ink = words.map((word) => {
    const quarter = (word.y2 - word.y1) / 4;
    return { ...word, y1: word.y1 + quarter, y2: word.y2 - quarter };
  });
  return ink.flatMap((a, i) =>
    ink
      .slice(i + 1)
      .filter((b) => a.x1 < b.x2 - 0.5 && b.x1 < a.x2 - 0.5 && a.y1 < b.y2 && b.y1 < a.y2)
      .map((b) => `${a.text} / ${b.text}`),
  );
}

describe('the look', () => {
  it('reads in grey: hatch, tint and dots differ without colour', async () => {
    const file = await print(vHullInput());
    run('pdftoppm', '-r', '150', '-gray', '-singlefile', file, join(folder, 'grey'));
    const { width, at } = readGrey(join(folder, 'grey.pgm'));
    const scale = 150 / 72;
    expect(width).toBe(Math.ceil(595.28 * scale));
    // a strip inside the rail, right of its ticks: x 83…90 pt
    const [left, right] = [Math.round(83 * scale), Math.round(90 * scale)];
    const share = (from: number, to: number, test: (grey: number) => boolean): number => {
      let hits = 0;
      for (let y = Math.ceil(from); y < to; y += 1) {
        for (let x = left; x < right; x += 1) if (test(at(x, y))) hits += 1;
      }
      return hits / ((Math.floor(to) - Math.ceil(from)) * (right - left));
    };
    // the longest even tint stands between the outlet (40 mm) and the quarter (250 mm)
    const tint = longestTint(at, Math.round(86 * scale), Math.round(842 * scale));
    const perMm = (tint.to - tint.from) / 210;
    const isInk = (grey: number): boolean => grey < 200;
    expect(share(tint.from + 2, tint.to - 2, isInk)).toBe(0);
    const hatched = share(tint.to + 3, tint.to + 38 * perMm, isInk);
    expect(hatched).toBeGreaterThan(0.15);
    const at40 = tint.to;
    const dotted = share(at40 - 458 * perMm, at40 - 449 * perMm, isInk);
    expect(dotted).toBeGreaterThan(0);
    expect(dotted).toBeLessThan(hatched);
  });
});

function readGrey(file: string): { width: number; at(x: number, y: number): number } {
  const bytes = readFileSync(file);
  const head = /^P5\s(\d+)\s(\d+)\s255\s/.exec(bytes.subarray(0, 40).toString('latin1'))!;
  const width = Number(head[1]);
  return { width, at: (x, y) => bytes[head[0].length + y * width + x]! };
}

/** The longest run of light grey, no ink in it, down one column of pixels. */
function longestTint(
  at: (x: number, y: number) => number,
  x: number,
  bottom: number,
): { from: number; to: number } {
  let best = { from: 0, to: 0 };
  let from = 0;
  for (let y = 0; y < bottom; y += 1) {
    const grey = at(x, y);
    if (grey < 215 || grey > 245) from = y + 1;
    else if (y - from > best.to - best.from) best = { from, to: y };
  }
  return best;
}
