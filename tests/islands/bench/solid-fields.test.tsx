import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import type { TankDocument } from '~/domain/tank/document';
import { startingSettings } from '~/domain/tank/complete-settings';
import { kinds, solidSchema, type Solid } from '~/domain/tank/kinds/registry';
import { valueAt } from '~/domain/tank/value-at';
import { formatLength } from '~/domain/units/format-length';
import { SolidFields } from '~/islands/bench/SolidFields';

afterEach(cleanup);

function show(kind: (typeof kinds)[number]) {
  return showSolid(kind.blank('part'));
}

function showSolid(solid: Solid) {
  const document: TankDocument = {
    format: 'dipwright-tank',
    version: 1,
    name: 'Tank',
    solids: [solid],
  };
  render(
    <SolidFields
      solid={solid}
      document={document}
      dispatch={() => {}}
      unit="mm"
      settings={startingSettings('diesel')}
      onSettings={() => {}}
      faults={[]}
    />,
  );
  return solid;
}

it.each(kinds.map((kind) => [kind.label, kind] as const))(
  'offers every size of a %s, and only directions that the document takes',
  (_label, kind) => {
    const solid = show(kind);
    const sizes = within(screen.getByRole('group', { name: 'Sizes of part' }));
    const values = sizes.getAllByRole<HTMLInputElement>('textbox').map(({ value }) => value);
    const wanted = kind
      .sizes(solid)
      .map(({ path }) => formatLength(Number(valueAt(solid, path)), 'mm'));
    // fields of options that are not set stand empty
    expect(values.filter((value) => value !== '').sort()).toEqual(wanted.sort());
    const axis = screen.queryByLabelText('axis');
    expect(axis !== null).toBe(kind.axes !== null);
    if (axis === null) return;
    const choices = within(axis).getAllByRole<HTMLOptionElement>('option');
    for (const { value } of choices) {
      expect(solidSchema.safeParse({ ...solid, axis: value }).success, value).toBe(true);
    }
  },
);

it('offers the sizes of each end of a cylinder, with their values', () => {
  showSolid({
    id: 'part',
    role: 'holds',
    kind: 'cylinder',
    diameter: 500,
    length: 1000,
    ends: [
      { form: 'dish', depth: 80 },
      { form: 'torisphere', crown: 510, knuckle: 50 },
    ],
  });
  const sizes = within(screen.getByRole('group', { name: 'Sizes of part' }));
  const fields = sizes.getAllByRole<HTMLInputElement>('textbox').map(({ value }) => value);
  expect(fields).toEqual(['500', '1\u202f000', '80', '510', '50']);
  const right = within(sizes.getByRole('group', { name: 'right end (high x)' }));
  expect(right.getByLabelText<HTMLInputElement>('crown').value).toBe('510');
});

it('takes a place of an outline below 0, and a new value where it stands in the lists', () => {
  const hull = kinds.find(({ kind }) => kind === 'stations')!.blank('part');
  const typed: TankDocument[] = [];
  const document: TankDocument = {
    format: 'dipwright-tank',
    version: 1,
    name: 'Tank',
    solids: [hull],
  };
  render(
    <SolidFields
      solid={hull}
      document={document}
      dispatch={(action) => action.type === 'edit' && typed.push(action.edit(document))}
      unit="mm"
      settings={startingSettings('diesel')}
      onSettings={() => {}}
      faults={[]}
    />,
  );
  const field = screen.getByLabelText('station 2, point 4, y');
  fireEvent.change(field, { target: { value: '-333' } });
  fireEvent.keyDown(field, { key: 'Enter' });
  fireEvent.blur(field);
  const after = typed.at(-1)!.solids[0]!;
  if (after.kind !== 'stations') throw new Error('another kind');
  expect(after.stations[1]!.profile[3]).toEqual([-333, 410]);
  expect(solidSchema.safeParse(after).success).toBe(true);
});
