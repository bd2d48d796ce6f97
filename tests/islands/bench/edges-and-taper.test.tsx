import { cleanup, screen, within } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import { blank, showBenchOf, type } from './bench-of-one';

afterEach(cleanup);

it('rounds edges of a box by typing, sharp where left empty, and says what no ball rolls', () => {
  const bench = showBenchOf(blank('box'));
  const edges = within(screen.getByRole('group', { name: 'Radius of the edges of part' }));
  const along = (label: string) => edges.getByLabelText<HTMLInputElement>(label);
  expect(along('edges along x').value).toBe('');
  expect(along('edges along x').placeholder).toBe('sharp');
  type(along('along z'), '4 cm');
  expect(bench.solid('box').edges).toEqual({ z: 40 });
  expect(bench.undoNames()).toEqual(['edges along z of part']);
  type(along('along y'), '20');
  expect(edges.getByRole('alert').textContent).toMatch(/at most one of the three radii/);
  type(along('along y'), '');
  expect(bench.solid('box').edges).toEqual({ z: 40 });
  expect(edges.queryByRole('alert')).toBeNull();
  type(along('along z'), '250');
  expect(edges.getByRole('alert').textContent).toMatch(/does not fit.*200 mm/);
  type(along('along z'), '-3');
  expect(along('along z').value).toBe('-3');
  expect(bench.solid('box').edges).toEqual({ z: 250 });
});

it('offers all measures of a taper, the shift also where none was told', () => {
  const { shift: _none, ...plain } = blank('taper');
  const bench = showBenchOf(plain);
  const labels = ['bottom x', 'bottom y', 'top x', 'top y', 'height', 'shift x', 'shift y'];
  const sizes = within(screen.getByRole('group', { name: 'Sizes of part' }));
  for (const label of labels) expect(sizes.getByLabelText(label)).toBeTruthy();
  type(sizes.getByLabelText('shift y'), '-25');
  expect(bench.solid('taper').shift).toEqual([0, -25]);
  type(sizes.getByLabelText('top x'), '700');
  expect(bench.solid('taper').top).toEqual([700, 400]);
});
