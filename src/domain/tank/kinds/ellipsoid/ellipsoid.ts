import type { Vec3 } from '../../solid';
import { ball } from '../ball';
import type { Kind } from '../kind';
import { sizeWords } from '../size-words';
import { ellipsoidSchema, type Ellipsoid } from './schema';

export const ellipsoid: Kind<Ellipsoid> = {
  kind: 'ellipsoid',
  label: 'ellipsoid',
  schema: ellipsoidSchema,
  curved: () => 'twice',
  extent: sizesOf,
  axes: null,
  sizes: () => [
    { path: ['length'], label: 'length', unit: 'mm' },
    { path: ['width'], label: 'width', unit: 'mm' },
    { path: ['height'], label: 'height', unit: 'mm' },
  ],
  words: (solid) => sizeWords(...sizesOf(solid)),
  shape: (solid, facets, tank) => ball.shape(sizesOf(solid), facets, tank),
  support: (solid, up) => ball.support(sizesOf(solid), up),
  chords: (solid, line, slack) => ball.chords(sizesOf(solid), line, slack),
  volume: (solid) => ball.volume(sizesOf(solid)),
  faults: () => [],
  blank: (id) => ({ id, role: 'holds', kind: 'ellipsoid', length: 800, width: 500, height: 400 }),
};

function sizesOf({ length, width, height }: Ellipsoid): Vec3 {
  return [length, width, height];
}
