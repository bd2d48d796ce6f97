import type { TankDocument } from '~/domain/tank/document';
import type { Prism } from '~/domain/tank/kinds/prism/schema';
import { resizeSolid } from './commands';
import { midwayOn } from './midway-on';

export type ProfilePoint = Prism['profile'][number];

/** Sets x, z or the radius of a point of a prism, mm; null as a radius leaves the corner sharp. */
export function setProfileNumber(
  document: TankDocument,
  id: string,
  index: number,
  part: 0 | 1 | 2,
  valueMm: number | null,
): TankDocument {
  return changeProfile(document, id, (profile) =>
    profile.map((point, i): ProfilePoint => {
      if (i !== index) return point;
      const [x, z, radius] = point;
      if (part === 2) return valueMm ? [x, z, valueMm] : [x, z];
      const value = valueMm ?? 0;
      const at: [number, number] = part === 0 ? [value, z] : [x, value];
      return radius === undefined ? at : [...at, radius];
    }),
  );
}

/** A new point on the middle of the side that follows a point: the shape stays as it is. */
export function addProfilePoint(document: TankDocument, id: string, after: number): TankDocument {
  return changeProfile(document, id, (profile) =>
    profile.toSpliced(after + 1, 0, midwayOn(profile, after)),
  );
}

export function removeProfilePoint(document: TankDocument, id: string, index: number) {
  return changeProfile(document, id, (profile) => profile.toSpliced(index, 1));
}

/** Takes other points from one on, to the end of the profile. */
export function replaceProfile(
  document: TankDocument,
  id: string,
  from: number,
  points: readonly ProfilePoint[],
): TankDocument {
  return changeProfile(document, id, (profile) => [...profile.slice(0, from), ...points]);
}

function changeProfile(
  document: TankDocument,
  id: string,
  change: (profile: Prism['profile']) => Prism['profile'],
): TankDocument {
  return resizeSolid(document, id, (solid) =>
    solid.kind === 'prism' ? { ...solid, profile: change(solid.profile) } : solid,
  );
}
