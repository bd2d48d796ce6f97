import { expect, it } from 'vitest';
import { newTank } from '~/domain/tank/tank';
import { firstHull, vHull } from '~/islands/front/v-hull';
import { carriedCode, newTankForm, newTankOf } from '~/islands/workshop/new-tank-form';

const typed = {
  installationId: 'i1',
  name: 'Port tank',
  liquid: 'diesel',
  densityKgPerM3: '',
  startingPoint: 'v-hull',
} as const;

it('sends the chosen shape under the name of the tank', () => {
  const sent = newTankOf(newTankForm.parse(typed), null);
  expect(newTank.safeParse(sent).success).toBe(true);
  expect(sent.design).toMatchObject({
    name: 'Port tank',
    solids: [{ kind: 'wedge' }, { kind: 'wedge' }],
  });
  expect(sent.settings).toBeUndefined();
});

it('sends the draft that was carried along', () => {
  const hull = vHull({ ...firstHull, depthMm: 333 });
  const sent = newTankOf(newTankForm.parse({ ...typed, startingPoint: carriedCode }), hull);
  expect(sent.design?.solids[0]).toMatchObject({ height: 333 });
});

it('asks for a density only where the liquid has none, in the words of the settings', () => {
  const faults = (densityKgPerM3: string) =>
    newTankForm
      .safeParse({ ...typed, liquid: 'other', densityKgPerM3 })
      .error?.issues.map((i) => [i.path, i.message]);
  expect(faults('')).toEqual([[['densityKgPerM3'], 'Give the density in kg/m³.']]);
  expect(faults('1,2,3')).toEqual([[['densityKgPerM3'], 'Give the density in kg/m³.']]);
  expect(faults('39')).toEqual([
    [['densityKgPerM3'], 'A density lies between 400 and 3000 kg/m³.'],
  ]);
  expect(faults('870,5')).toBeUndefined();
  const sent = newTankOf(
    newTankForm.parse({ ...typed, liquid: 'other', densityKgPerM3: '870,5' }),
    null,
  );
  expect(sent.settings).toEqual({ densityKgPerM3: 870.5 });
});
