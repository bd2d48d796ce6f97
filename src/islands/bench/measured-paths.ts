import { hasMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { kindOf, type Solid } from '~/domain/tank/kinds/registry';

/** What was measured of a solid, each with a ± of its own if one is given; nothing of a mesh that is not here yet. */
export function measuredPaths(solid: Solid): (readonly string[])[] {
  if (solid.kind === 'mesh' && !hasMesh(solid.upload)) return [];
  const kind = kindOf(solid);
  return (kind.measured?.(solid) ?? kind.sizes(solid)).map(({ path }) => path);
}
