import { z } from 'zod/v4';
import { lengthUnits } from '../units/length-unit';
import { volumeUnits } from '../units/volume-unit';

export const papers = ['a4', 'letter'] as const;
export type Paper = (typeof papers)[number];

/**
 * How a chart is printed: the query of GET /api/v1/revisions/{id}/chart.pdf. Numbers may come as
 * text. `stepMm` must be a mark of the stick: whole millimetres, or whole eighths of an inch.
 */
export const chartOptions = z
  .strictObject({
    paper: z.enum(papers, 'The paper is a4 or letter.').default('a4'),
    length: z.enum(lengthUnits, 'The length is in mm, cm or in.').default('mm'),
    volume: z
      .enum(volumeUnits, 'The volume is in l, usgal or impgal: a gallon says which.')
      .default('l'),
    stepMm: z.coerce
      .number('Give the step of the rows in millimetres.')
      .min(1, 'A step is 1 mm or more.')
      .max(1000, 'A step is at most 1000 mm.')
      .optional(),
  })
  .superRefine(({ length, stepMm }, context) => {
    if (stepMm === undefined) return;
    const mark = length === 'in' ? 25.4 / 8 : 1;
    if (Math.abs(stepMm / mark - Math.round(stepMm / mark)) > 1e-6) {
      context.addIssue({
        code: 'custom',
        path: ['stepMm'],
        message:
          length === 'in'
            ? 'In inches a step is a number of eighths: 3.175, 6.35, 12.7 or 25.4 mm.'
            : 'A step is a whole number of millimetres, such as 5 or 10.',
      });
    }
  });
export type ChartOptions = z.infer<typeof chartOptions>;
