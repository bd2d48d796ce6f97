import { z } from 'zod/v4';
import { tankDocument } from '../tank/document';

/** Most rows that one table may have; beyond it a larger step is asked for. */
export const mostRows = 20_000;

const stepMm = z
  .number('Give the step in millimetres.')
  .positive('A step is more than 0 mm.')
  .max(100_000);
const atMm = z
  .array(z.number('Give a depth in millimetres.').min(0, 'A depth is 0 mm or more.'))
  .min(1, 'Give at least one depth.')
  .max(mostRows, 'Give at most 20 000 depths.');

/** Which readings the rows stand at. */
export type Readings = { stepMm: number } | { atMm: readonly number[] };

/** POST /api/v1/compute: exactly one of stepMm and atMm. */
export const computeRequest = z
  .strictObject({ design: tankDocument, stepMm: stepMm.optional(), atMm: atMm.optional() })
  .superRefine((request, context) => {
    // a faulty one of the two is told already, and left out of what is seen here
    if (context.issues.some(({ path }) => path?.[0] === 'stepMm' || path?.[0] === 'atMm')) return;
    if ((request.stepMm === undefined) === (request.atMm === undefined)) {
      context.addIssue({
        code: 'custom',
        path: ['stepMm'],
        message: 'Give either stepMm or atMm.',
      });
    }
  });

export const tableRow = z.object({
  /** Reading along the stick from its zero; without a stick, plumb height above the lowest point. mm */
  depthMm: z.number(),
  volumeL: z.number(),
  /** Free surface of the liquid, cm². */
  surfaceCm2: z.number(),
  /** Centroid of the liquid in the tank's frame, mm. */
  centroidMm: z.tuple([z.number(), z.number(), z.number()]),
});
export type TableRow = z.infer<typeof tableRow>;

/** What `strap` prints and /api/v1/compute answers. */
export const computedTable = z.object({
  capacityL: z.number(),
  /** The highest reading. */
  heightMm: z.number(),
  /** Table maximum of |V₂ₙ − Vₙ|. */
  errorL: z.number(),
  triangles: z.number().int(),
  undrainableL: z.number(),
  trappedL: z.number(),
  rows: z.array(tableRow),
});
export type ComputedTable = z.infer<typeof computedTable>;

/** A row as issued and kept: what look-ups and prints are made from. */
export const issuedRow = z.object({
  depthMm: z.number(),
  volumeL: z.number(),
  surfaceCm2: z.number(),
  /** ± of the litres at this reading (about 95 %): sizes, dip and computing in quadrature. */
  plusMinusL: z.number(),
});
export type IssuedRow = z.infer<typeof issuedRow>;

/** A row as it is kept: asked for and printed, or a closer one that only look-ups and their curve use. */
export interface KeptRow extends IssuedRow {
  betweenRows: boolean;
}
