import { z } from 'zod/v4';
import { box } from './box/box';
import { boxSchema } from './box/schema';
import { cone } from './cone/cone';
import { coneSchema } from './cone/schema';
import { cylinder } from './cylinder/cylinder';
import { cylinderSchema } from './cylinder/schema';
import { ellipsoid } from './ellipsoid/ellipsoid';
import { ellipsoidSchema } from './ellipsoid/schema';
import type { Kind } from './kind';
import { mesh } from './mesh/mesh';
import { meshSchema } from './mesh/schema';
import { oval } from './oval/oval';
import { ovalSchema } from './oval/schema';
import { prism } from './prism/prism';
import { prismSchema } from './prism/schema';
import { sphereSchema } from './sphere/schema';
import { sphere } from './sphere/sphere';
import { stationsSchema } from './stations/schema';
import { stations } from './stations/stations';
import { taperSchema } from './taper/schema';
import { taper } from './taper/taper';
import { wedgeSchema } from './wedge/schema';
import { wedge } from './wedge/wedge';

const known = 'box, cylinder, wedge, oval, sphere, ellipsoid, cone, taper, prism, stations or mesh';

export const solidSchema = z.discriminatedUnion(
  'kind',
  [
    boxSchema,
    cylinderSchema,
    wedgeSchema,
    ovalSchema,
    sphereSchema,
    ellipsoidSchema,
    coneSchema,
    taperSchema,
    prismSchema,
    stationsSchema,
    meshSchema,
  ],
  {
    error: `The kind of a solid is ${known}.`,
  },
);
export type Solid = z.infer<typeof solidSchema>;

/** Every kind that is made from typed sizes, in the order the bench offers them. A mesh is made from a file. */
export const kinds: readonly Kind<Solid>[] = [
  erased(box),
  erased(cylinder),
  erased(wedge),
  erased(oval),
  erased(sphere),
  erased(ellipsoid),
  erased(cone),
  erased(taper),
  erased(prism),
  erased(stations),
];

const everyKind = [...kinds, erased(mesh)];

/** What Dipwright knows about a solid's kind. */
export function kindOf(solid: Solid): Kind<Solid> {
  return everyKind.find(({ kind }) => kind === solid.kind)!;
}

// a kind is only ever handed solids of its own kind: kindOf picks it by that field
function erased<S extends Solid>(kind: Kind<S>): Kind<Solid> {
  return kind as unknown as Kind<Solid>;
}
