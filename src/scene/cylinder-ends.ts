import type { TankDocument } from '~/domain/tank/document';
import type { End } from '~/domain/tank/kinds/cylinder/schema';
import { resizeSolid } from './commands';

/** 0: at the low end of the axis; 1: at the high end. */
export type Which = 0 | 1;

/** An end of a form as it is usually made for a barrel of a diameter, mm; to be corrected by who measures. */
export function usualEnd(form: End['form'], diameterMm: number): End {
  const share = (part: number) => Math.round(diameterMm * part * 10) / 10;
  switch (form) {
    case 'flat':
      return { form };
    case 'cone':
      return { form, depth: share(1 / 4) };
    case 'dish':
      return { form, depth: share(1 / 5) };
    case 'ellipsoid':
      // two to one
      return { form, depth: share(1 / 4) };
    case 'torisphere':
      return { form, crown: diameterMm, knuckle: share(1 / 10) };
  }
}

/** Gives one end of a cylinder another form, in its usual sizes; the way it is turned stays. */
export function setEndForm(
  document: TankDocument,
  id: string,
  which: Which,
  form: End['form'],
): TankDocument {
  return changeEnd(document, id, which, (end, diameterMm) => {
    const usual = usualEnd(form, diameterMm);
    return end.inward && form !== 'flat' ? { ...usual, inward: true } : usual;
  });
}

export function setEndInward(
  document: TankDocument,
  id: string,
  which: Which,
  inward: boolean,
): TankDocument {
  return changeEnd(document, id, which, ({ inward: _old, ...end }) =>
    inward && end.form !== 'flat' ? { ...end, inward } : end,
  );
}

/** Says of a cylinder whose ends were not told that both are flat. */
export function tellFlatEnds(document: TankDocument, id: string): TankDocument {
  return changeEnd(document, id, 0, (end) => end);
}

function changeEnd(
  document: TankDocument,
  id: string,
  which: Which,
  change: (end: End, diameterMm: number) => End,
): TankDocument {
  return resizeSolid(document, id, (solid) => {
    if (solid.kind !== 'cylinder') return solid;
    const ends: [End, End] = [...(solid.ends ?? [{ form: 'flat' }, { form: 'flat' }])];
    ends[which] = change(ends[which], solid.diameter);
    return { ...solid, ends };
  });
}
