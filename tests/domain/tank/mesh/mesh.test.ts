import { describe, expect, it } from 'vitest';
import { computePreview } from '~/domain/table/compute-preview';
import { computeTable } from '~/domain/table/compute-table';
import { issueTable } from '~/domain/table/issue-table';
import type { ComputedTable } from '~/domain/table/request';
import { startingSettings } from '~/domain/tank/complete-settings';
import type { TankDocument } from '~/domain/tank/document';
import { hasMesh, loadedMesh, provideMesh } from '~/domain/tank/kinds/mesh/loaded-meshes';
import { namedMeshes } from '~/domain/tank/kinds/mesh/named-meshes';
import type { Solid } from '~/domain/tank/kinds/registry';
import { parseDesign } from '~/domain/tank/parse-design';
import { importMesh } from '~/geometry/mesh-import/import-mesh';
import type { Mesh } from '~/geometry/mesh';
import {
  asAsciiStl,
  asBinaryStl,
  asObj,
  boxMesh,
  together,
  turnedOver,
} from '../../../geometry/mesh-import/mesh-files';

const meshSolid = (upload: string, rest: Partial<Solid> = {}): Solid =>
  ({ id: 'shell', role: 'holds', kind: 'mesh', upload, ...rest }) as Solid;
const tank = (solids: Solid[], rest: Partial<TankDocument> = {}): TankDocument => ({
  format: 'dipwright-tank',
  version: 1,
  name: 'Test',
  solids,
  ...rest,
});

/** The same table to one part in 10⁹ of capacity, and to a nanometre in the readings. */
function expectSame(one: ComputedTable, other: ComputedTable) {
  expect(one.rows.length).toBe(other.rows.length);
  expect(Math.abs(one.heightMm - other.heightMm)).toBeLessThan(1e-6);
  expect(Math.abs(one.capacityL / other.capacityL - 1)).toBeLessThan(1e-9);
  expect(Math.abs(one.undrainableL - other.undrainableL)).toBeLessThan(1e-9 * other.capacityL);
  expect(Math.abs(one.trappedL - other.trappedL)).toBeLessThan(1e-9 * other.capacityL);
  one.rows.forEach((row, i) => {
    const twin = other.rows[i]!;
    expect(Math.abs(row.volumeL - twin.volumeL)).toBeLessThan(1e-9 * other.capacityL);
    row.centroidMm.forEach((mm, axis) => expect(mm).toBeCloseTo(twin.centroidMm[axis]!, 4));
  });
}

// a place in the file far from its origin, so that nothing rests on it
provideMesh('box', boxMesh([900, 500, 300], [-10_000, 77, 1234]));
const boxSolid = (rest: Partial<Solid> = {}): Solid =>
  ({
    id: 'shell',
    role: 'holds',
    kind: 'box',
    length: 900,
    width: 500,
    height: 300,
    ...rest,
  }) as Solid;

describe('a mesh against the same solid made from sizes', () => {
  const stands = [
    {},
    { stick: { at: [50, 250] } },
    {
      attitude: { pitch: 3, roll: -2 },
      stick: { at: [450, 250] },
      outlet: [450, 250, 0],
      vent: [450, 250, 300],
    },
    { stick: { at: [0, 0] }, outlet: [0, 0, 0] },
  ] as Partial<TankDocument>[];

  it.each(stands)('a box that stands like %j', async (stand) => {
    expectSame(
      await computeTable(tank([meshSolid('box')], stand), { stepMm: 30 }),
      await computeTable(tank([boxSolid()], stand), { stepMm: 30 }),
    );
  });

  it.each([
    [[0, 0, 90], {}],
    [[90, 0, 0], {}],
    [[20, -35, 50], {}],
    [[20, -35, 50], { attitude: { pitch: -7, roll: 4 }, stick: { at: [460, 210] } }],
  ] as const)('a box turned by %j, tank %j', async (turn, stand) => {
    const at = [10, -40, 25];
    const place = { at, turn } as unknown as Partial<Solid>;
    expectSame(
      await computeTable(tank([meshSolid('box', place)], stand as never), { stepMm: 30 }),
      await computeTable(tank([boxSolid(place)], stand as never), { stepMm: 30 }),
    );
  });

  it('joined with a box that shares a face, and with a wedge that displaces', async () => {
    const others = [
      {
        id: 'dome',
        role: 'holds',
        kind: 'box',
        length: 200,
        width: 200,
        height: 50,
        at: [100, 100, 300],
      },
      {
        id: 'ramp',
        role: 'displaces',
        kind: 'wedge',
        length: 800,
        width: 500,
        height: 60,
        at: [100, 0, 0],
        turn: [0, 0, 180],
      },
    ] as Solid[];
    const stand = {
      stick: { at: [50, 250] },
      outlet: [50, 250, 20],
      attitude: { pitch: 1, roll: 0.5 },
    } as Partial<TankDocument>;
    expectSame(
      await computeTable(tank([meshSolid('box'), ...others], stand), { stepMm: 20 }),
      await computeTable(tank([boxSolid(), ...others], stand), { stepMm: 20 }),
    );
  });

  it('a mesh that displaces', async () => {
    provideMesh('arch', boxMesh([10, 20, 8]));
    const arch = { id: 'arch', role: 'displaces', at: [300, 0, 0] } as Partial<Solid>;
    const sizes = { kind: 'box', length: 100, width: 200, height: 80 } as Partial<Solid>;
    expectSame(
      await computeTable(tank([boxSolid(), meshSolid('arch', { ...arch, scale: 10 } as never)]), {
        stepMm: 10,
      }),
      await computeTable(tank([boxSolid(), { ...arch, ...sizes } as Solid]), { stepMm: 10 }),
    );
  });

  it('a cylinder in 40 flat faces, lying and turned, against the prism of that outline', async () => {
    const n = 40;
    const outline = Array.from({ length: n }, (_, i) => {
      const angle = (2 * Math.PI * (i + 0.3)) / n;
      return [200 * Math.cos(angle), 200 * Math.sin(angle)] as [number, number];
    });
    const positions = [0, 1000].flatMap((y) => outline.flatMap(([x, z]) => [x, y, z]));
    const triangles: number[] = [];
    for (let i = 0; i < n; i += 1) {
      const j = (i + 1) % n;
      triangles.push(i, n + j, j, i, n + i, n + j);
      if (i > 0 && j > 0) triangles.push(0, i, j, n, n + j, n + i);
    }
    provideMesh('polygon', {
      positions: Float64Array.from(positions),
      triangles: Uint32Array.from(triangles),
    });
    const prism = {
      id: 'shell',
      role: 'holds',
      kind: 'prism',
      profile: outline,
      width: 1000,
    } as unknown as Solid;
    for (const turn of [
      [0, 0, 0],
      [15, 40, -70],
    ] as [number, number, number][]) {
      const stand = { attitude: { pitch: 2, roll: 5 } };
      const one = await computeTable(tank([meshSolid('polygon', { turn })], stand), { stepMm: 25 });
      expectSame(one, await computeTable(tank([{ ...prism, turn }], stand), { stepMm: 25 }));
      // n/2·r²·sin(2π/n) a section
      // corners snapped to 1e-6 mm
      expect(one.capacityL).toBeCloseTo((n / 2) * 4e4 * Math.sin((2 * Math.PI) / n) * 1e-3, 6);
    }
  });

  it('the same ± as the box has, of its sizes and of the dip', async () => {
    const settings = { ...startingSettings('drinking-water'), sizePlusMinusMm: 3 };
    for (const turn of [
      [0, 0, 0],
      [20, 0, 10],
    ] as [number, number, number][]) {
      const stand = { stick: { at: [450, 250] } } as Partial<TankDocument>;
      const one = await issueTable(tank([meshSolid('box', { turn })], stand), settings, 50);
      const other = await issueTable(tank([boxSolid({ turn })], stand), settings, 50);
      other.rows.forEach(({ plusMinusL }, i) => {
        expect(one.rows[i]!.plusMinusL).toBeCloseTo(plusMinusL, 6);
      });
      expect(other.rows[3]!.plusMinusL).toBeGreaterThan(0.5);
    }
  });

  it('a hollow: the void inside a body is no liquid space', async () => {
    provideMesh(
      'hollow',
      together(boxMesh([900, 500, 300]), turnedOver(boxMesh([100, 100, 100], [400, 200, 100]))),
    );
    const { rows, capacityL } = await computeTable(tank([meshSolid('hollow')]), {
      atMm: [100, 150, 300],
    });
    expect(capacityL).toBeCloseTo(134, 9);
    [45, 67, 134].forEach((litres, i) => expect(rows[i]!.volumeL).toBeCloseTo(litres, 9));
  });
});

describe('a tetrahedron, by hand', () => {
  // corner at the origin, edges 300, 200, 600 up: V(h) = V·(1 − (1 − h/600)³)
  const tetrahedron: Mesh = {
    positions: Float64Array.of(0, 0, 0, 300, 0, 0, 0, 200, 0, 0, 0, 600),
    triangles: Uint32Array.of(0, 2, 1, 0, 1, 3, 0, 3, 2, 1, 2, 3),
  };
  it.each([
    ['binary STL', asBinaryStl],
    ['ASCII STL', (mesh: Mesh) => asAsciiStl(mesh)],
    ['OBJ', asObj],
  ] as const)('from %s, in three units', async (format, write) => {
    const { mesh } = await importMesh([write(tetrahedron)]);
    provideMesh(format, mesh);
    for (const scale of [1, 0.1, 25.4]) {
      const { rows, capacityL } = await computeTable(tank([meshSolid(format, { scale })]), {
        atMm: [0, 0.25, 0.5, 1].map((part) => part * 600 * scale),
      });
      expect(capacityL / ((300 * 200 * 600) / 6e6) / scale ** 3).toBeCloseTo(1, 12);
      [0, 1 - 0.75 ** 3, 1 - 0.5 ** 3, 1].forEach((part, i) => {
        expect(rows[i]!.volumeL / capacityL).toBeCloseTo(part, 11);
      });
    }
  });
});

describe('what is refused', () => {
  const refusal = (document: TankDocument) =>
    computeTable(document, { stepMm: 10 }).then(
      () => null,
      ({ code, faults }: { code: string; faults: unknown }) => ({ code, faults }),
    );

  it('a mesh that was not loaded, naming solid and field', async () => {
    expect(await refusal(tank([boxSolid({ id: 'a' }), meshSolid('nowhere')]))).toEqual({
      code: 'invalid',
      faults: [
        {
          pointer: '/solids/1/upload',
          detail: 'Solid "shell", upload: there is no such mesh here: upload its file again.',
        },
      ],
    });
    expect(() => loadedMesh({ id: 'shell', upload: 'nowhere' })).toThrow('Solid "shell", upload');
  });

  it('a scale that makes it too large or too small', async () => {
    for (const [scale, words] of [
      [200, 'at this scale the mesh is 180000 × 100000 × 60000 mm'],
      [1e-5, 'and a size is at least 0.01 mm'],
    ] as const) {
      const told = await refusal(tank([meshSolid('box', { scale })]));
      expect(told).toMatchObject({ code: 'invalid', faults: [{ pointer: '/solids/0/scale' }] });
      expect(JSON.stringify(told)).toContain(words);
    }
  });

  it('fields that are none of a mesh', () => {
    for (const [rest, pointer] of [
      [{ scale: 0 }, '/solids/0/scale'],
      [{ scale: Infinity }, '/solids/0/scale'],
      [{ upload: '' }, '/solids/0/upload'],
      [{ upload: 'x'.repeat(201) }, '/solids/0/upload'],
      [{ length: 5 }, '/solids/0/length'],
      [{ stretch: [2, 2, 2] }, '/solids/0/stretch'],
    ] as const) {
      expect(() => parseDesign(tank([meshSolid('box', rest as never)]))).toThrow(
        expect.objectContaining({
          code: 'invalid',
          faults: [expect.objectContaining({ pointer })],
        }),
      );
    }
  });

  it('outside sizes', async () => {
    const outside = tank([meshSolid('box')], { wall: { thickness: 5, sizes: 'outside' } });
    expect(await refusal(outside)).toMatchObject({
      code: 'invalid',
      faults: [{ pointer: '/wall/sizes' }],
    });
  });
});

describe('the store of meshes', () => {
  it('keeps those used last, up to three million triangles', () => {
    const large = (triangles: number): Mesh => ({
      positions: Float64Array.of(0, 0, 0, 1, 0, 0, 0, 1, 0),
      triangles: new Uint32Array(3 * triangles),
    });
    provideMesh('first', large(1_000_000));
    provideMesh('second', large(1_000_000));
    expect(hasMesh('first')).toBe(true);
    provideMesh('third', large(1_500_000));
    expect(['first', 'second', 'third'].map(hasMesh)).toEqual([true, false, true]);
    provideMesh('huge', large(4_000_000));
    expect(['first', 'third', 'huge'].map(hasMesh)).toEqual([false, false, true]);
  });

  it('is asked for each mesh of a design once', () => {
    const design = tank([
      meshSolid('a'),
      boxSolid({ id: 'b' }),
      meshSolid('c', { id: 'c' }),
      meshSolid('a', { id: 'd' }),
    ]);
    expect(namedMeshes(design)).toEqual([
      { upload: 'a', solidId: 'shell', pointer: '/solids/0/upload' },
      { upload: 'c', solidId: 'c', pointer: '/solids/2/upload' },
    ]);
  });
});

it('a preview may be handed to another thread, and the next one is computed all the same', async () => {
  provideMesh('box', boxMesh([900, 500, 300]));
  const document = tank([meshSolid('box')]);
  for (let run = 0; run < 2; run += 1) {
    const { capacityL, space, solids } = await computePreview(document);
    expect(capacityL).toBeCloseTo(135, 9);
    const transfer = [space, ...solids].flatMap(({ positions, triangles }) => [
      positions.buffer,
      triangles.buffer,
    ]);
    structuredClone(transfer, { transfer });
  }
});
