import { describe, expect, it } from 'vitest';
import { enclosedVolume, shifted, type Mesh } from '~/geometry/mesh';
import { meshFaults } from '~/geometry/mesh-import/mesh-faults';
import { boxMesh, together, turnedOver } from './mesh-files';

const box = boxMesh([900, 500, 300]);
const without = ({ positions, triangles }: Mesh, ...gone: number[]): Mesh => ({
  positions,
  triangles: triangles.filter((_, n) => !gone.includes(Math.floor(n / 3))),
});

describe('what is taken', () => {
  it('a closed outward mesh as it is', () => {
    expect(meshFaults(box)).toMatchObject({ faults: [], notes: [] });
    expect(enclosedVolume(meshFaults(box).mesh)).toBe(900 * 500 * 300);
  });

  it('one that is inside out as a whole, turned over and said so', () => {
    const { mesh, notes, faults } = meshFaults(turnedOver(box));
    expect({ notes, faults }).toEqual({
      notes: ['The mesh was inside out and was turned over.'],
      faults: [],
    });
    expect(enclosedVolume(mesh)).toBe(900 * 500 * 300);
  });

  it('bodies apart, and a void whose shell looks inward', () => {
    const hollow = together(boxMesh([10, 10, 10]), turnedOver(boxMesh([4, 4, 4], [3, 3, 3])));
    expect(meshFaults(hollow).faults).toEqual([]);
    expect(enclosedVolume(meshFaults(hollow).mesh)).toBeCloseTo(1000 - 64, 9);
    const apart = together(hollow, boxMesh([5, 5, 5], [20, 0, 0]), boxMesh([1, 1, 1], [4, 4, 4]));
    // the last stands inside the void: a body again
    expect(meshFaults(apart)).toMatchObject({ faults: [], notes: [] });
    expect(enclosedVolume(meshFaults(turnedOver(apart)).mesh)).toBeCloseTo(1000 - 64 + 125 + 1, 9);
  });

  it('one with triangles that have no area', () => {
    const more = { ...box, triangles: Uint32Array.of(...box.triangles, 3, 3, 5, 1, 1, 1) };
    expect(meshFaults(more)).toMatchObject({
      faults: [],
      notes: ['2 triangles without area left out.'],
    });
  });

  it('one whose seam is open by less than a millionth of its size', () => {
    // the lid has corners of its own, 0.0001 mm off on a box of 1 m
    const lid = without(box, 0, 1, 4, 5, 6, 7, 8, 9, 10, 11);
    const open = together(without(box, 2, 3), shifted(lid, [1e-4, -1e-4, 0]));
    const { mesh, notes, faults } = meshFaults(open);
    expect(faults).toEqual([]);
    expect(notes).toEqual([
      '4 edges of seams were open by less than a millionth of the size and closed.',
    ]);
    expect(enclosedVolume(mesh)).toBeCloseTo(900 * 500 * 300, -3);
    const wide = together(without(box, 2, 3), shifted(lid, [0.01, 0, 0]));
    expect(meshFaults(wide).faults[0]).toMatch(/^The mesh is not closed: 2 holes/);
  });
});

describe('what is told', () => {
  it.each([
    [
      'a hole, with the middle of its rim',
      without(box, 2, 3),
      'The mesh is not closed: 1 hole, near x 450, y 250, z 300 (4 edges). Close it in the program that wrote it.',
    ],
    [
      'two holes',
      without(box, 2, 3, 0),
      /^The mesh is not closed: 2 holes, near x 450, y 250, z 300 \(4 edges\); near x .* \(3 edges\)\. /,
    ],
    [
      'one face turned',
      {
        ...box,
        triangles: Uint32Array.of(
          ...box.triangles.slice(3),
          ...turnedOver(box).triangles.slice(0, 3),
        ),
      },
      /^Faces look opposite ways across 3 edges, the first near x .*: turn the faces so that all look outward\.$/,
    ],
    [
      'a fin',
      together(box, {
        positions: Float64Array.of(0, 0, 0, 900, 0, 0, 450, -50, 0),
        triangles: Uint32Array.of(0, 1, 2),
      }),
      /^The mesh is not closed: 1 hole/,
    ],
    [
      'one of two bodies inside out',
      together(box, turnedOver(boxMesh([10, 10, 10], [1000, 0, 0]))),
      '1 of 2 shells has its faces turned the wrong way, the first with its top near x 1000, y 0, z 10: a shell that stands by itself looks outward.',
    ],
    [
      'a body inside another',
      together(box, boxMesh([10, 10, 10], [400, 200, 100])),
      /^1 of 2 shells has its faces turned the wrong way, the first with its top near x 400, y 200, z 110: a shell inside another bounds a void and looks inward/,
    ],
    [
      'bodies that overlap',
      together(box, boxMesh([900, 500, 300], [800, 100, 100])),
      /^The mesh crosses itself or its bodies overlap, found near x 8\d\d/,
    ],
    [
      'nothing',
      { positions: new Float64Array(0), triangles: new Uint32Array(0) },
      'The file holds no triangle with an area.',
    ],
    [
      'a folded sheet',
      { positions: box.positions, triangles: Uint32Array.of(0, 1, 2, 0, 2, 1) },
      'The mesh is closed but flat: it encloses no volume.',
    ],
  ])('%s', (_, mesh, sentence) => {
    const { faults } = meshFaults(mesh);
    expect(faults).toHaveLength(1);
    expect(faults[0]).toMatch(sentence instanceof RegExp ? sentence : `${sentence}`);
  });

  it('an edge of four faces, where two bodies share it', () => {
    const touching = together(boxMesh([10, 10, 10]), boxMesh([10, 10, 10], [10, 10, 0]));
    // as a file gives them: the shared corners are one
    const { positions, triangles } = touching;
    const same = new Map<string, number>();
    const into = Array.from({ length: positions.length / 3 }, (_, i) => {
      const key = positions.slice(3 * i, 3 * i + 3).join();
      if (!same.has(key)) same.set(key, i);
      return same.get(key)!;
    });
    expect(meshFaults({ positions, triangles: triangles.map((i) => into[i]!) }).faults).toEqual([
      '1 edge has more than two faces, the first near x 10, y 10, z 5: join the bodies that meet there, or part them.',
    ]);
  });
});
