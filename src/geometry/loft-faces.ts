import { patchNormal, patchOf, patchTwist, type Loft } from './loft';
import { snapMm } from './tolerance';
import { dot, type Vec3 } from './vec3';

/** Planes normal·p = offset of a loft's flat faces: its two ends and the patches that are not twisted. */
export function flatFacesOf(loft: Loft): { normal: Vec3; offset: number }[] {
  const { x, sections } = loft;
  const sides = sections.slice(1).flatMap((section, i) =>
    section.flatMap((_, j) => {
      const patch = patchOf(loft, i, j);
      if (patchTwist(patch) > snapMm) return [];
      const normal = patchNormal(patch);
      return [{ normal, offset: dot(normal, patch[0]) }];
    }),
  );
  return [
    { normal: [-1, 0, 0], offset: -x[0]! },
    { normal: [1, 0, 0], offset: x.at(-1)! },
    ...sides,
  ];
}
