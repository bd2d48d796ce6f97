import { cleanup, fireEvent, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import type { TankDocument } from '~/domain/tank/document';
import { renamedPlusMinus } from '~/islands/bench/renamed-plus-minus';
import { renameSolid, setSize } from '~/scene/commands';
import { blank, showBenchOf, type } from './bench-of-one';

afterEach(cleanup);

function open() {
  fireEvent.click(screen.getByRole('button', { name: 'Give a size its own ±' }));
  return within(screen.getByRole('group', { name: 'Own ± of sizes of part' }));
}

it('says the ± of a solid’s sizes and lets one have its own, and go back', () => {
  const bench = showBenchOf(blank('box'));
  expect(screen.getByText(/± of these sizes/).textContent).toMatch(/: 2\u00a0mm by tape\. /);
  const group = open();
  const length = group.getByLabelText<HTMLInputElement>('± length');
  expect(length.value).toBe('');
  expect(length.placeholder).toBe('2');
  type(length, '± 0.5');
  expect(bench.settings().ownSizePlusMinusMm).toEqual({ 'part/length': 0.5 });
  expect(screen.getByText(/± of these sizes/).textContent).toMatch(/by tape, 1 with its own/);
  type(group.getByLabelText('± height'), '-1');
  expect(group.getByRole('alert').textContent).toBe('A ± is 0 or more.');
  type(length, '');
  expect(bench.settings().ownSizePlusMinusMm).toEqual({});
});

it('offers the sizes of an outline by choice, since they are many', () => {
  const bench = showBenchOf(blank('prism'));
  const group = open();
  expect(group.queryAllByRole('textbox')).toHaveLength(0);
  fireEvent.change(group.getByLabelText('which size?'), {
    target: { value: 'part/profile/2/1' },
  });
  type(group.getByLabelText('± point 3, z'), '5');
  expect(bench.settings().ownSizePlusMinusMm).toEqual({ 'part/profile/2/1': 5 });
});

describe('when a solid is renamed', () => {
  const before: TankDocument = {
    format: 'dipwright-tank',
    version: 1,
    name: 'Tank',
    solids: [blank('box'), { ...blank('cylinder'), id: 'vat' }],
  };
  const own = { 'part/length': 0.5, 'vat/length': 3, 'part/length/of old': 7 };

  it('carries the ± of its sizes along, there and back', () => {
    const after = renameSolid(before, 'part', 'body')!;
    const carried = renamedPlusMinus(before, after, own);
    expect(carried).toEqual({ 'body/length': 0.5, 'vat/length': 3, 'part/length/of old': 7 });
    expect(renamedPlusMinus(after, before, carried!)).toEqual(own);
  });

  it('leaves them when nothing was renamed, or another solid has the name now', () => {
    expect(renamedPlusMinus(before, before, own)).toBeNull();
    expect(renamedPlusMinus(before, setSize(before, 'part', ['length'], 9), own)).toBeNull();
    expect(
      renamedPlusMinus(before, { ...before, solids: before.solids.toReversed() }, own),
    ).toBeNull();
  });
});
