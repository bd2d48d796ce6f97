import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, expect, it } from 'vitest';
import { startingSettings } from '~/domain/tank/complete-settings';
import { DipwrightError } from '~/domain/errors';
import { refuseUncomputable } from '~/domain/table/refuse-uncomputable';
import { PartsList } from '~/islands/bench/PartsList';
import { blank } from './bench-of-one';

afterEach(cleanup);

it('says a fault of the engine at the cell that it points to, without the way there', () => {
  const document = {
    format: 'dipwright-tank' as const,
    version: 1 as const,
    name: 'Tank',
    solids: [
      blank('box'),
      {
        ...blank('prism'),
        id: 'hull: fore',
        profile: [
          [300, 0],
          [600, 500],
          [0, 500, 900],
        ] as [number, number, number?][],
      },
    ],
  };
  let faults: DipwrightError['faults'] = [];
  try {
    refuseUncomputable(document);
  } catch (error) {
    if (error instanceof DipwrightError) ({ faults } = error);
  }
  expect(faults[0]?.detail).toMatch(/^Solid "hull: fore", profile/);
  render(
    <PartsList
      document={document}
      selected="hull: fore"
      dispatch={() => {}}
      unit="mm"
      settings={startingSettings('diesel')}
      onSettings={() => {}}
      faults={faults}
    />,
  );
  const sizes = within(screen.getByRole('group', { name: 'Sizes of hull: fore' }));
  expect(sizes.getByLabelText('profile, point 3, radius').getAttribute('aria-invalid')).toBe(
    'true',
  );
  expect(sizes.getByRole('alert').textContent).toMatch(/^radius: A radius of 900 mm does not fit/);
});
