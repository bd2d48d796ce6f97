import { describe, expect, it } from 'vitest';
import { tankDocument, type TankDocument } from '~/domain/tank/document';
import { kindOf, kinds, type Solid } from '~/domain/tank/kinds/registry';
import { setEdgeRadius } from '~/scene/box-edges';
import { setEndForm, setEndInward, tellFlatEnds, usualEnd } from '~/scene/cylinder-ends';
import {
  addStation,
  addStationPoint,
  removeStation,
  removeStationPoint,
  replaceStationPoints,
} from '~/scene/hull-stations';
import {
  addProfilePoint,
  removeProfilePoint,
  replaceProfile,
  setProfileNumber,
} from '~/scene/prism-profile';
import { setTaperShift } from '~/scene/taper-shift';

const forms = ['flat', 'cone', 'dish', 'ellipsoid', 'torisphere'] as const;

function tankOf(solid: Solid, stick?: TankDocument['stick']): TankDocument {
  return {
    format: 'dipwright-tank',
    version: 1,
    name: 'Tank',
    solids: [solid],
    ...(stick && { stick }),
  };
}

function blank<K extends Solid['kind']>(kind: K): Extract<Solid, { kind: K }> {
  return kinds.find((one) => one.kind === kind)!.blank('part') as Extract<Solid, { kind: K }>;
}

function solidOf<K extends Solid['kind']>(
  document: TankDocument,
  _kind: K,
): Extract<Solid, { kind: K }> {
  return document.solids[0] as Extract<Solid, { kind: K }>;
}

function volumeL(document: TankDocument): number {
  const solid = document.solids[0]!;
  return kindOf(solid).volume(solid) / 1e6;
}

describe('ends of a cylinder', () => {
  it.each(forms)(
    'makes either end %s in sizes that the document takes and a barrel can have',
    (form) => {
      for (const diameter of [12, 412.5, 3000]) {
        const before = tankOf({ ...blank('cylinder'), diameter });
        for (const which of [0, 1] as const) {
          const after = setEndForm(before, 'part', which, form);
          expect(tankDocument.safeParse(after).success).toBe(true);
          expect(kindOf(after.solids[0]!).faults(after.solids[0]!)).toEqual([]);
          const ends = solidOf(after, 'cylinder').ends!;
          expect(ends[which]).toEqual(usualEnd(form, diameter));
          expect(ends[1 - which]).toEqual({ form: 'flat' });
        }
        expect(before.solids[0]).not.toHaveProperty('ends');
      }
    },
  );

  it('gives what each form holds: V of a barrel of 500 by 1000 and one end, from the closed forms', () => {
    const r = 250;
    const before = tankOf({ ...blank('cylinder'), diameter: 500, length: 1000 });
    const barrel = Math.PI * r * r * 1000;
    // cone π r² h / 3; cap π h (3 r² + h²) / 6; half a spheroid 2 π r² h / 3
    const holds = {
      flat: 0,
      cone: (Math.PI * r * r * 125) / 3,
      dish: (Math.PI * 100 * (3 * r * r + 100 * 100)) / 6,
      ellipsoid: (2 * Math.PI * r * r * 125) / 3,
    };
    for (const [form, end] of Object.entries(holds)) {
      const after = setEndForm(before, 'part', 1, form as keyof typeof holds);
      expect(volumeL(after)).toBeCloseTo((barrel + end) / 1e6, 9);
      if (form === 'flat') continue;
      const inward = setEndInward(after, 'part', 1, true);
      expect(volumeL(inward)).toBeCloseTo((barrel - end) / 1e6, 9);
    }
  });

  it('keeps which way an end is turned from form to form, but a flat one has none', () => {
    const inward = setEndInward(
      setEndForm(tankOf(blank('cylinder')), 'part', 0, 'dish'),
      'part',
      0,
      true,
    );
    expect(solidOf(setEndForm(inward, 'part', 0, 'cone'), 'cylinder').ends?.[0]).toEqual({
      form: 'cone',
      depth: 100,
      inward: true,
    });
    expect(solidOf(setEndForm(inward, 'part', 0, 'flat'), 'cylinder').ends?.[0]).toEqual({
      form: 'flat',
    });
    expect(solidOf(setEndInward(inward, 'part', 0, false), 'cylinder').ends?.[0]).toEqual({
      form: 'dish',
      depth: 80,
    });
  });

  it('keeps a stick in the middle when an end stands further out, and tells that ends are flat', () => {
    const before = tankOf(blank('cylinder'), { at: [400, 200] });
    // 800 long; a dish of 400/5 at one end moves the middle by 40
    expect(setEndForm(before, 'part', 1, 'dish').stick?.at).toEqual([440, 200]);
    // but not when it stands in the middle of a box as well: it may be the box's
    const both = {
      ...before,
      solids: [...before.solids, { ...blank('box'), id: 'box', length: 800 }],
    };
    expect(setEndForm(both, 'part', 1, 'dish').stick?.at).toEqual([400, 200]);
    expect(solidOf(tellFlatEnds(before, 'part'), 'cylinder').ends).toEqual([
      { form: 'flat' },
      { form: 'flat' },
    ]);
  });
});

describe('edges of a box', () => {
  it('rounds edges along one axis at a time, and writes nothing of sharp ones', () => {
    const before = tankOf(blank('box'));
    const one = setEdgeRadius(before, 'part', 'z', 40);
    expect(solidOf(one, 'box').edges).toEqual({ z: 40 });
    // four corners of the plan lose (4 − π) r² together
    const { length, width, height } = blank('box');
    expect(volumeL(one)).toBeCloseTo(((length * width - (4 - Math.PI) * 1600) * height) / 1e6, 9);
    const two = setEdgeRadius(one, 'part', 'x', 10);
    expect(solidOf(two, 'box').edges).toEqual({ x: 10, z: 40 });
    expect(setEdgeRadius(setEdgeRadius(two, 'part', 'x', 0), 'part', 'z', 0)).toEqual(before);
  });
});

describe('taper', () => {
  it('takes a shift that was not told yet, and leaves the volume as it is', () => {
    const { shift: _none, ...plain } = blank('taper');
    const before = tankOf(plain);
    const after = setTaperShift(before, 'part', 1, -30);
    expect(solidOf(after, 'taper').shift).toEqual([0, -30]);
    expect(tankDocument.safeParse(after).success).toBe(true);
    expect(volumeL(after)).toBeCloseTo(volumeL(before), 12);
  });
});

describe('profile of a prism', () => {
  const before = tankOf(blank('prism'));

  it('sets x, z and radius of a point, and leaves the radius out again', () => {
    const rounded = setProfileNumber(before, 'part', 1, 2, 25);
    expect(solidOf(rounded, 'prism').profile[1]).toEqual([600, 120, 25]);
    const moved = setProfileNumber(rounded, 'part', 1, 0, 580);
    expect(solidOf(moved, 'prism').profile[1]).toEqual([580, 120, 25]);
    expect(solidOf(setProfileNumber(moved, 'part', 1, 2, null), 'prism').profile[1]).toEqual([
      580, 120,
    ]);
    expect(solidOf(before, 'prism').profile[1]).toEqual([600, 120]);
  });

  it('adds points that leave the shape as it is, on every side, and takes them away again', () => {
    const { profile } = solidOf(before, 'prism');
    profile.forEach((_, i) => {
      const after = addProfilePoint(before, 'part', i);
      expect(solidOf(after, 'prism').profile).toHaveLength(profile.length + 1);
      expect(volumeL(after)).toBeCloseTo(volumeL(before), 12);
      expect(removeProfilePoint(after, 'part', i + 1)).toEqual(before);
    });
  });

  it('makes a V of 600 by 500, 1200 long, of pasted points: half of 600 × 500 × 1200', () => {
    const v = replaceProfile(before, 'part', 0, [
      [300, 0],
      [600, 500],
      [0, 500],
    ]);
    const solid = { ...solidOf(v, 'prism'), width: 1200 };
    expect(kindOf(solid).volume(solid) / 1e6).toBeCloseTo(180, 9);
    expect(solidOf(replaceProfile(v, 'part', 2, [[10, 500]]), 'prism').profile).toEqual([
      [300, 0],
      [600, 500],
      [10, 500],
    ]);
  });
});

describe('stations of a hull', () => {
  const before = tankOf(blank('stations'));
  const { stations } = solidOf(before, 'stations');

  it('copies the last station as far on as it stands from the one before', () => {
    const after = addStation(before, 'part');
    const longer = solidOf(after, 'stations').stations;
    expect(longer).toHaveLength(4);
    expect(longer[3]).toEqual({ ...stations[2], x: 1800 });
    expect(tankDocument.safeParse(after).success).toBe(true);
    expect(removeStation(after, 'part', 3)).toEqual(before);
  });

  it('adds a point in every station, the shape as it is, while all have as many', () => {
    const after = addStationPoint(before, 'part', 1, 2);
    expect(solidOf(after, 'stations').stations.map(({ profile }) => profile.length)).toEqual([
      6, 6, 6,
    ]);
    expect(volumeL(after)).toBeCloseTo(volumeL(before), 9);
    expect(removeStationPoint(after, 'part', 0, 3)).toEqual(before);
  });

  it('changes one station alone while they are uneven, so that it can be mended', () => {
    const shorter = replaceStationPoints(before, 'part', 1, 2, [[0, 410]]);
    expect(solidOf(shorter, 'stations').stations.map(({ profile }) => profile.length)).toEqual([
      5, 3, 5,
    ]);
    const mended = addStationPoint(addStationPoint(shorter, 'part', 1, 0), 'part', 1, 0);
    expect(solidOf(mended, 'stations').stations.map(({ profile }) => profile.length)).toEqual([
      5, 5, 5,
    ]);
  });
});
