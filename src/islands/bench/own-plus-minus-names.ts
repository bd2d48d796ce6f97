import { kindOf, type Solid } from '~/domain/tank/kinds/registry';
import { endName } from './end-names';

/** What a measured size of a solid is called where its ± is typed: as its own field is. */
export function ownPlusMinusNames(solid: Solid): (path: readonly string[]) => string {
  const labels = new Map(
    kindOf(solid)
      .sizes(solid)
      .map(({ path, label }) => [path.join('/'), label]),
  );
  return (path) => {
    const [first, index, last] = path;
    if (solid.kind === 'cylinder' && first === 'ends') {
      return `${endName(solid.axis ?? 'x', index === '0' ? 0 : 1, false)} ${last}`;
    }
    if (solid.kind === 'box' && first === 'edges') {
      // equal radii are one length
      const radius = solid.edges?.[index as 'x'];
      const axes = (['x', 'y', 'z'] as const).filter((axis) => solid.edges?.[axis] === radius);
      return `edges along ${axes.join(', ')}`;
    }
    if (solid.kind === 'prism' && first === 'profile') {
      return `point ${Number(index) + 1}, ${['x', 'z', 'radius'][Number(last)]}`;
    }
    return labels.get(path.join('/')) ?? path.join(' ');
  };
}
