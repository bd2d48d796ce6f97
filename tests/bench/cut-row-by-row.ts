import Module from 'manifold-3d';
import type { Mesh } from '~/geometry/mesh';

/**
 * The mesh library's own way to a table: cut off what is above a level, ask for the volume. Its mesh is
 * made beforehand and not counted. Levels along z of the mesh.
 */
export async function cutRowByRow(mesh: Mesh): Promise<(level: number) => number> {
  const library = await Module();
  library.setup();
  const { Manifold, Mesh: LibraryMesh } = library;
  const solid = Manifold.ofMesh(
    new LibraryMesh({
      numProp: 3,
      vertProperties: Float32Array.from(mesh.positions),
      triVerts: mesh.triangles,
    }),
  );
  return (level) => {
    const wet = solid.trimByPlane([0, 0, -1], -level);
    const volume = wet.volume();
    wet.delete();
    return volume;
  };
}
