import { cleanup, fireEvent, screen, within } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import { blank, showBenchOf, type } from './bench-of-one';

afterEach(cleanup);

const barrel = { ...blank('cylinder'), diameter: 500, length: 1000 };

function end(name: string) {
  return within(screen.getByRole('group', { name }));
}

it('asks for the ends of a new cylinder: flat is shown, and said to be untold', () => {
  const bench = showBenchOf(barrel);
  for (const name of ['left end (low x)', 'right end (high x)']) {
    const select = end(name).getByLabelText<HTMLSelectElement>(name);
    expect(select.value).toBe('flat');
    expect([...select.options].map(({ text }) => text)).toEqual([
      'flat',
      'cone',
      'dished (ball cap)',
      'elliptical',
      'torispherical',
    ]);
    expect(end(name).queryByRole('checkbox')).toBeNull();
  }
  expect(bench.solid('cylinder').ends).toBeUndefined();
  fireEvent.click(screen.getByRole('button', { name: 'They are flat' }));
  expect(bench.solid('cylinder').ends).toEqual([{ form: 'flat' }, { form: 'flat' }]);
  expect(screen.queryByText(/are not told/)).toBeNull();
});

it('gives a chosen form usual sizes, types them, turns it inward, and says the length over both', () => {
  const bench = showBenchOf(barrel);
  for (const name of ['left end (low x)', 'right end (high x)']) {
    fireEvent.change(end(name).getByLabelText(name), { target: { value: 'ellipsoid' } });
  }
  // two to one: a quarter of the diameter
  expect(bench.solid('cylinder').ends).toEqual([
    { form: 'ellipsoid', depth: 125 },
    { form: 'ellipsoid', depth: 125 },
  ]);
  expect(screen.getByText(/tip to tip/).textContent).toBe(
    'straight, tip to tip 1\u202f250\u00a0mm',
  );

  const right = end('right end (high x)');
  type(right.getByLabelText('depth'), '9 cm');
  fireEvent.click(right.getByRole('checkbox', { name: 'inward' }));
  expect(bench.solid('cylinder').ends?.[1]).toEqual({
    form: 'ellipsoid',
    depth: 90,
    inward: true,
  });
  expect(screen.getByText(/tip to tip/).textContent).toBe(
    'straight, tip to tip 1\u202f125\u00a0mm',
  );
  expect(bench.undoNames().at(-1)).toBe('right end (high x) of part inward');
});

it('says a fault of an end beside it, with what was typed kept', () => {
  const bench = showBenchOf({
    ...barrel,
    ends: [{ form: 'torisphere', crown: 500, knuckle: 50 }, { form: 'flat' }],
  });
  const left = end('left end (low x)');
  type(left.getByLabelText('crown'), '200');
  expect(bench.solid('cylinder').ends?.[0]).toMatchObject({ crown: 200 });
  expect(left.getByRole('alert').textContent).toMatch(/crown is at least .*250 mm/);
  type(left.getByLabelText('crown'), 'wide');
  expect(left.getByLabelText<HTMLInputElement>('crown').value).toBe('wide');
  expect(bench.solid('cylinder').ends?.[0]).toMatchObject({ crown: 200 });
});

it.each([
  ['y', 'near end (low y)', 'far end (high y)'],
  ['z', 'bottom end (low z)', 'top end (high z)'],
] as const)('names the ends along %s as they are seen', (axis, low, high) => {
  showBenchOf({ ...barrel, axis });
  expect(screen.getByLabelText(low)).toBeTruthy();
  expect(screen.getByLabelText(high)).toBeTruthy();
});

it('names the ends of a turned cylinder by its axis alone', () => {
  showBenchOf({ ...barrel, turn: [0, 0, 90] });
  expect(screen.getByLabelText('low x end, before turning')).toBeTruthy();
});
