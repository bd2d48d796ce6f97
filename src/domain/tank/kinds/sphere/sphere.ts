import { ball } from '../ball';
import type { Kind } from '../kind';
import { sizeWords } from '../size-words';
import { sphereSchema, type Sphere } from './schema';

export const sphere: Kind<Sphere> = {
  kind: 'sphere',
  label: 'sphere',
  schema: sphereSchema,
  curved: () => 'twice',
  extent: ({ diameter }) => [diameter, diameter, diameter],
  axes: null,
  sizes: () => [{ path: ['diameter'], label: 'diameter', unit: 'mm' }],
  words: ({ diameter }) => `⌀ ${sizeWords(diameter)}`,
  shape: ({ diameter }, facets, tank) => ball.shape([diameter, diameter, diameter], facets, tank),
  support: ({ diameter }, up) => ball.support([diameter, diameter, diameter], up),
  chords: ({ diameter }, line, slack) => ball.chords([diameter, diameter, diameter], line, slack),
  volume: ({ diameter }) => ball.volume([diameter, diameter, diameter]),
  eroded(solid, wallMm) {
    const diameter = solid.diameter - 2 * wallMm;
    return diameter > 0 ? { solid: { ...solid, diameter }, shift: [0, 0, 0] } : null;
  },
  faults: () => [],
  blank: (id) => ({ id, role: 'holds', kind: 'sphere', diameter: 500 }),
};
