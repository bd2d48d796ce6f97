import type { End } from '~/domain/tank/kinds/cylinder/schema';
import type { Solid } from '~/domain/tank/kinds/registry';

const forms: readonly End[] = [
  { form: 'flat' },
  { form: 'cone', depth: 130 },
  { form: 'dish', depth: 60 },
  { form: 'dish', depth: 200 },
  { form: 'ellipsoid', depth: 100 },
  { form: 'ellipsoid', depth: 310 },
  { form: 'torisphere', crown: 400, knuckle: 24 },
  { form: 'torisphere', crown: 240, knuckle: 170 },
  // a crown of the barrel's own radius: a hemisphere
  { form: 'torisphere', crown: 200, knuckle: 50 },
];
const axes = ['x', 'y', 'z'] as const;

/** Barrels 400 × 700 with every form of end, standing out and turned inward, beside one of another form. */
export const cylindersWithEnds: readonly Solid[] = forms.flatMap((low, i): Solid[] => {
  const high = forms[(i + 4) % forms.length]!;
  const fields = { id: 'it', role: 'holds', kind: 'cylinder', diameter: 400, length: 700 } as const;
  const axis = axes[i % 3]!;
  const outward: Solid = { ...fields, axis, ends: [low, high] };
  if (low.form === 'flat') return [outward];
  const inward: Solid = {
    ...fields,
    axis: axes[(i + 1) % 3]!,
    ends: [{ ...low, inward: true }, i % 2 === 0 ? high : { ...low, inward: true }],
  };
  return [outward, inward];
});
