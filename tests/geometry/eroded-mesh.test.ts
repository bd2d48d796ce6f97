import Module from 'manifold-3d';
import { beforeAll, describe, expect, it } from 'vitest';
import { circleOutline } from '~/geometry/circle';
import { erodedMesh } from '~/geometry/eroded-mesh';
import { erodedShape } from '~/geometry/eroded-shape';
import { loadManifold, meshOf, spaceOf } from '~/geometry/manifold';
import { enclosedVolume, type Mesh } from '~/geometry/mesh';
import { placing } from '~/geometry/placing';
import type { Shape } from '~/geometry/shape';
import { shells } from '~/geometry/shells';

beforeAll(() => loadManifold());

const at = (x: number, y: number, z: number) => placing([x, y, z], [0, 0, 0], [0, 0, 0]);

function block(length: number, width: number, height: number): Shape {
  const [a, b] = [length / 2, width / 2];
  return {
    form: 'extrusion',
    axis: 'z',
    outline: [
      [-a, -b],
      [a, -b],
      [a, b],
      [-a, b],
    ],
    length: height,
  };
}

const rod = (axis: 'x' | 'z', radius: number, length: number, facets: number): Shape => ({
  form: 'extrusion',
  axis,
  outline: circleOutline(radius, facets, 0),
  length,
});

describe('a mesh less a wall', () => {
  it('a block is a smaller block, and too thick a wall leaves nothing', () => {
    const mesh = meshOf({ shape: block(400, 300, 200), place: at(0, 0, 0) }, [0, 0, 0]);
    expect(enclosedVolume(erodedMesh(mesh, 20, 0.2))).toBeCloseTo(360 * 260 * 160, 3);
    expect(erodedMesh(mesh, 101, 0.2).triangles).toHaveLength(0);
  });

  it('a block with a bite out of a corner: edges a quarter of a cylinder, the inner corner an eighth of a ball', () => {
    const mesh = spaceOf(
      [{ shape: block(400, 400, 400), place: at(0, 0, 0) }],
      [{ shape: block(200, 200, 200), place: at(100, 100, 100) }],
      [0, 0, 0],
    );
    // 360³ less what lies within 20 of the bite inside it: its 200³ swollen by 20 on three sides,
    // cut at 180: a cube of 180 in reach of the walls, three slabs, three quarter rods, an eighth of a ball
    const [t, s] = [20, 180];
    const bite = s ** 3 + 3 * t * s * s + (3 * Math.PI * t * t * s) / 4 + (Math.PI * t ** 3) / 6;
    const left = enclosedVolume(erodedMesh(mesh, t, Math.PI / 32));
    // the cap at the corner is inscribed: a little less of it is taken off
    expect(Math.abs(left - (360 ** 3 - bite))).toBeLessThan(0.003 * ((Math.PI * t ** 3) / 6));
  });

  it('falls apart where a neck is narrower than two walls', () => {
    const mesh = spaceOf(
      [
        { shape: block(200, 200, 200), place: at(-150, 0, 0) },
        { shape: block(200, 200, 200), place: at(150, 0, 0) },
        { shape: block(400, 30, 30), place: at(0, 0, 0) },
      ],
      [],
      [0, 0, 0],
    );
    expect(shells(erodedMesh(mesh, 14, 0.2))).toHaveLength(1);
    const apart = shells(erodedMesh(mesh, 16, 0.2)).filter(({ volumeMm3 }) => volumeMm3 > 1);
    expect(apart).toHaveLength(2);
  });

  it('lies between the library’s own differences by a ball from inside and by one from outside', async () => {
    const facets = 24;
    const wallMm = 12;
    const mesh = spaceOf(
      [
        { shape: rod('x', 250, 1000, facets), place: at(0, 0, 0) },
        { shape: rod('z', 100, 300, facets), place: at(0, 0, 200) },
      ],
      [],
      [0, 0, 0],
    );
    const own = enclosedVolume(erodedMesh(mesh, wallMm, 0.2));
    const library = await Module();
    library.setup();
    const { Manifold } = library;
    const drawn = Manifold.ofMesh(
      new library.Mesh({
        numProp: 3,
        vertProperties: Float32Array.from(mesh.positions),
        triVerts: mesh.triangles,
      }),
    );
    // a ball of flat faces: inside the true one, and swollen until its faces touch it from outside
    const less = (factor: number) =>
      drawn.minkowskiDifference(Manifold.sphere(wallMm * factor, 16)).volume();
    const [inscribed, circumscribed] = [less(1), less(1 / Math.cos(Math.PI / 8))];
    expect(own).toBeLessThan(inscribed + 1);
    expect(own).toBeGreaterThan(circumscribed - 1);
    expect(circumscribed / inscribed).toBeGreaterThan(0.98);
  }, 60_000);
});

describe('a shape less a wall', () => {
  const volumeOf = (shape: Shape | null) =>
    shape ? enclosedVolume(meshOf({ shape, place: at(0, 0, 0) }, [0, 0, 0])) : 0;

  it('an outline that the wall parts is two bodies', () => {
    // two squares of 100 joined by a neck 10 wide and 50 long
    const outline = [
      [-125, -50],
      [-25, -50],
      [-25, -5],
      [25, -5],
      [25, -50],
      [125, -50],
      [125, 50],
      [25, 50],
      [25, 5],
      [-25, 5],
      [-25, 50],
      [-125, 50],
    ] as const;
    const shape: Shape = { form: 'extrusion', axis: 'z', outline, length: 100 };
    const left = erodedShape(shape, 6, 64)!;
    expect(left.form).toBe('mesh');
    expect(shells((left as { mesh: Mesh }).mesh)).toHaveLength(2);
    // in the mouth of the neck the ball of 6 rises by 6 − √(6² − 5²): a dimple of about 10 mm² on either side
    expect(volumeOf(left) / 88).toBeGreaterThan(2 * 88 * 88);
    expect(volumeOf(left) / 88).toBeLessThan(2 * 88 * 88 + 40);
  });

  it('a body of revolution keeps its volume: frustum by closed form', () => {
    const profile = [
      [0, 0],
      [300, 0],
      [200, 400],
      [0, 400],
    ] as const;
    const shape: Shape = {
      form: 'revolution',
      axis: 'z',
      profile,
      facets: 64,
      phase: 0,
      stretch: [1, 1, 1],
    };
    const across = 10 * Math.hypot(1, 0.25);
    const [low, high] = [300 - 2.5 - across, 200 + 2.5 - across];
    const expected = ((Math.PI * 380) / 3) * (low * low + low * high + high * high);
    expect(Math.abs(volumeOf(erodedShape(shape, 10, 64)) / expected - 1)).toBeLessThan(1e-9);
  });
});
