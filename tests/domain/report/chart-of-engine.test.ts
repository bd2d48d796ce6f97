import { sketchOf } from '~/domain/report/sketch';
import { describe, expect, it } from 'vitest';
import { buildChart } from '~/domain/report/chart';
import { computePreview } from '~/domain/table/compute-preview';
import { issueTable } from '~/domain/table/issue-table';
import { cisternInput } from './sample-charts';

describe('a chart of a computed table', () => {
  it('gives the worked answers of the sloped cistern', async () => {
    const input = cisternInput();
    const { table, rows } = await issueTable(input.design, input.settings, 5);
    const { space, frame } = await computePreview(input.design);
    const sketch = sketchOf(space, frame);
    const report = buildChart({ ...input, ...table, rows, sketch });
    const litres = new Map(report.rows.map(({ cells }) => [cells[0], cells[1]]));
    // closed form: 0.05 h + h²/300 up to 60 mm, 15 + 0.45 (h − 60) above
    expect(['30', '60', '150', '300'].map((depth) => litres.get(depth))).toEqual([
      '4.5',
      '15.0',
      '55.5',
      '123.0',
    ]);
    expect(report.sketch).toMatchObject({
      view: 'side',
      widthText: '900',
      heightText: '300',
      outletY: 20,
    });
    expect(report.sketch?.lines.filter(({ hidden }) => !hidden)).toHaveLength(5);
  });
});
