import fc from 'fast-check';
import { strainedTank } from './strained-tanks';
import { plainTank, type PlainDesign } from './plain-tanks';

/** Values that have no business in a design, or only just. */
const odd = fc.constantFrom<unknown>(
  0,
  -1,
  -0,
  1e-7,
  1e-9,
  0.01,
  1e300,
  -1e300,
  100_000,
  100_001,
  null,
  true,
  '',
  '500',
  'x',
  [],
  {},
  [1, 2],
  [1, 2, 3, 4],
  { form: 'cone' },
);

/** The text of a design that somebody broke: one to four fields changed, dropped or added, or the text cut. */
const careless: fc.Arbitrary<string> = fc
  .record({
    tank: plainTank(4),
    breaks: fc.array(
      fc.record({
        how: fc.constantFrom('change', 'change', 'change', 'scale', 'drop', 'add'),
        where: fc.nat(),
        value: odd,
      }),
      { minLength: 1, maxLength: 4 },
    ),
    cut: fc.oneof(
      { weight: 19, arbitrary: fc.constant(1) },
      { weight: 1, arbitrary: fc.double({ min: 0, max: 1, noNaN: true }) },
    ),
    rest: fc.record(
      {
        stick: fc.constantFrom<PlainDesign['stick']>(
          { at: [0, 0] },
          { at: [9e4, 9e4] },
          { at: [100, 100], zero: 1e5 },
          { at: [100, 50], zero: -50 },
        ),
        outlet: fc.constantFrom<PlainDesign['outlet']>([0, 0, 0], [100, 100, 100], [-1e5, 0, 0]),
        wall: fc.constantFrom({ thickness: 0, sizes: 'inside' }, { thickness: -1, sizes: 'out' }),
      },
      { requiredKeys: [] },
    ),
  })
  .map(({ tank, breaks, cut, rest }) => {
    const design = structuredClone({ ...tank, ...rest }) as unknown as Record<string, unknown>;
    for (const { how, where, value } of breaks) {
      const places = placesIn(design);
      const { holder, key } = places[where % places.length]!;
      const now = (holder as Record<string, unknown>)[key];
      if (how === 'drop') {
        if (Array.isArray(holder)) holder.splice(Number(key), 1);
        else delete (holder as Record<string, unknown>)[key];
      } else if (how === 'add') {
        if (Array.isArray(holder)) holder.push(value);
        else (holder as Record<string, unknown>)[`${key}s`] = value;
      } else if (how === 'scale' && typeof now === 'number') {
        (holder as Record<string, unknown>)[key] = now * (where % 2 === 0 ? 37 : 1e-5);
      } else (holder as Record<string, unknown>)[key] = value;
    }
    const text = JSON.stringify(design);
    return text.slice(0, Math.round(cut * text.length));
  });

/** The text of a design gone wrong: half of them by carelessness, half strained within what the schema takes. */
export const brokenDesign: fc.Arbitrary<string> = fc.oneof(
  careless,
  strainedTank.map((tank) => JSON.stringify(tank)),
);

interface Place {
  holder: object;
  key: string;
}

function placesIn(value: unknown): Place[] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.keys(value).flatMap((key) => [
    { holder: value, key },
    ...placesIn((value as Record<string, unknown>)[key]),
  ]);
}
