import fc from 'fast-check';
import { plainTank, type PlainDesign } from './plain-tanks';

type Strain = (tank: PlainDesign, pick: number) => void;

/**
 * Tanks that the schema takes and that strain what comes after it: sizes at the ends of their range or far from
 * each other, ends like needles, solids that cancel, touch or lie 100 m apart, sticks, outlets and vents anywhere,
 * walls thicker than the tank.
 */
export const strainedTank: fc.Arbitrary<PlainDesign> = fc
  .record({
    tank: plainTank(3),
    strains: fc.array(
      fc.record({
        strain: fc.constantFrom<Strain>(
          scaledSize,
          scaledSize,
          extremeSize,
          extremeSize,
          hostileEnd,
          hostileEnd,
          farAway,
          cancelled,
          doubled,
          steep,
          stickAnywhere,
          openingAnywhere,
          walled,
        ),
        pick: fc.nat(),
      }),
      { minLength: 1, maxLength: 3 },
    ),
  })
  .map(({ tank, strains }) => {
    const design = structuredClone(tank);
    for (const { strain, pick } of strains) strain(design, pick);
    return design;
  });

const sizeNames = ['diameter', 'length', 'width', 'height', 'start', 'end'];

/** One of a list by a number as large as one likes. */
function oneOf<T>(list: readonly T[], pick: number): T {
  return list[pick % list.length]!;
}

function aSize(tank: PlainDesign, pick: number) {
  const solid = oneOf(tank.solids, pick);
  const names = sizeNames.filter((name) => typeof solid[name] === 'number');
  return names.length === 0 ? null : { solid, name: oneOf(names, pick >> 3) };
}

function scaledSize(tank: PlainDesign, pick: number) {
  const found = aSize(tank, pick);
  if (!found) return;
  const scaled =
    Number(found.solid[found.name]) * oneOf([1e-4, 1e-3, 0.02, 12, 37, 140], pick >> 5);
  found.solid[found.name] = Math.min(Math.max(scaled, 0.01), 100_000);
}

function extremeSize(tank: PlainDesign, pick: number) {
  const found = aSize(tank, pick);
  if (found)
    found.solid[found.name] = oneOf([0.01, 0.0100001, 0.05, 1, 99_999.99, 100_000], pick >> 5);
}

function hostileEnd(tank: PlainDesign, pick: number) {
  const solid = tank.solids.find(({ kind }) => kind === 'cylinder');
  if (!solid) return;
  const diameter = Number(solid.diameter);
  const ends = solid.ends as unknown[];
  ends[pick % 2] = oneOf<Record<string, unknown>>(
    [
      { form: 'cone', depth: 0.01 },
      { form: 'cone', depth: 100_000 },
      { form: 'ellipsoid', depth: 0.01 },
      { form: 'ellipsoid', depth: 40 * diameter },
      { form: 'dish', depth: 0.01 },
      { form: 'dish', depth: diameter / 2 },
      { form: 'torisphere', crown: 100_000, knuckle: 0.01 },
      { form: 'torisphere', crown: diameter / 2, knuckle: diameter * 0.499 },
      { form: 'torisphere', crown: 30 * diameter, knuckle: diameter / 3 },
      { form: 'cone', depth: Number(solid.length), inward: true },
      { form: 'ellipsoid', depth: Number(solid.length) - 0.02, inward: true },
      { form: 'dish', depth: 0.01, inward: true },
    ],
    pick >> 3,
  );
}

function farAway(tank: PlainDesign, pick: number) {
  oneOf(tank.solids, pick).at = oneOf(
    [
      [100_000, 0, 0],
      [-100_000, 100_000, -100_000],
      [500, 0, 0],
      [0, 0, 1e-7],
    ],
    pick >> 3,
  );
}

function cancelled(tank: PlainDesign, pick: number) {
  const solid = oneOf(tank.solids, pick);
  tank.solids.push({ ...structuredClone(solid), id: 'filler', role: 'displaces' });
}

function doubled(tank: PlainDesign, pick: number) {
  const solid = oneOf(tank.solids, pick);
  const [x, y, z] = solid.at as [number, number, number];
  const shift = oneOf([0, 1e-9, 1e-6, 0.004, 0.02], pick >> 3);
  tank.solids.push({ ...structuredClone(solid), id: 'twin', at: [x + shift, y, z - shift] });
}

function steep(tank: PlainDesign, pick: number) {
  tank.attitude = oneOf(
    [
      { pitch: 60, roll: -60 },
      { pitch: -60, roll: 0 },
      { pitch: 1e-9, roll: 0 },
      { pitch: 0, roll: 90 },
    ],
    pick,
  );
}

function stickAnywhere(tank: PlainDesign, pick: number) {
  tank.stick = oneOf<NonNullable<PlainDesign['stick']>>(
    [
      { at: [0, 0] },
      { at: [100, 100] },
      { at: [90_000, -90_000] },
      { at: [100, 100], zero: 100_000 },
      { at: [100, 100], zero: -50 },
      { at: [150, 80], zero: 120 },
    ],
    pick,
  );
}

function openingAnywhere(tank: PlainDesign, pick: number) {
  const at = oneOf<[number, number, number]>(
    [
      [0, 0, 0],
      [100, 100, 100],
      [150, 200, 180],
      [-100_000, 0, 0],
      [250, 250, 250],
    ],
    pick >> 1,
  );
  if (pick % 2 === 0) tank.outlet = at;
  else tank.vent = at;
}

function walled(tank: PlainDesign, pick: number) {
  tank.wall = {
    thickness: oneOf([0.01, 0.5, 5, 20, 60, 400, 0.001, 100_000], pick),
    sizes: 'outside',
  };
}
