import { describe, expect, it } from 'vitest';
import type { TankDocument } from '~/domain/tank/document';
import type { End } from '~/domain/tank/kinds/cylinder/schema';
import type { Solid } from '~/domain/tank/kinds/registry';
import { startingPoints } from '~/domain/tank/starting-points';
import {
  copySolid,
  freeId,
  removeSolid,
  renameSolid,
  setAttitude,
  setPlace,
  setRole,
  setSize,
  setStick,
  setWall,
  setTurn,
} from '~/scene/commands';
import { newScene, sceneReducer } from '~/scene/scene';

const sloped = startingPoints.find(({ code }) => code === 'sloped-floor')!.design;

describe('commands on a design', () => {
  it('sets one size and leaves the document it came from as it was', () => {
    const before = structuredClone(sloped);
    const after = setSize(sloped, 'ramp', ['length'], 800);
    expect(after.solids[1]).toMatchObject({
      id: 'ramp',
      length: 800,
      width: 450,
      height: 70,
    });
    expect(sloped).toEqual(before);
    expect(after.solids[0]).toBe(sloped.solids[0]);
  });

  it('sets a size of one of two ends, whose list stays a list', () => {
    const ends: [End, End] = [
      { form: 'dish', depth: 80 },
      { form: 'torisphere', crown: 500, knuckle: 50 },
    ];
    const vat: Solid = {
      id: 'vat',
      role: 'holds',
      kind: 'cylinder',
      diameter: 500,
      length: 1000,
      ends,
    };
    const before: TankDocument = { ...sloped, solids: [vat], stick: { at: [500, 250] } };
    const deeper = setSize(before, 'vat', ['ends', '0', 'depth'], 120);
    expect(deeper.solids[0]).toEqual({ ...vat, ends: [{ form: 'dish', depth: 120 }, ends[1]] });
    const crowned = setSize(before, 'vat', ['ends', '1', 'crown'], 600);
    expect(crowned.solids[0]).toEqual({
      ...vat,
      ends: [ends[0], { form: 'torisphere', crown: 600, knuckle: 50 }],
    });
    expect(vat.ends).toBe(ends);
    expect(ends[0]).toEqual({ form: 'dish', depth: 80 });
  });

  it('keeps a stick at the middle of the solid whose size changes, and leaves another where it is', () => {
    const lying = startingPoints.find(({ code }) => code === 'lying-cylinder')!.design;
    const after = setSize(setSize(lying, 'barrel', ['diameter'], 1200), 'barrel', ['length'], 2000);
    expect(after.stick?.at).toEqual([1000, 600]);
    // 75 mm from the deep end of the sloped tank, in the middle across
    expect(setSize(sloped, 'body', ['length'], 900).stick?.at).toEqual([75, 225]);
    expect(setSize(sloped, 'body', ['width'], 500).stick?.at).toEqual([75, 250]);
    expect(setSize(sloped, 'ramp', ['width'], 500).stick).toEqual(sloped.stick);
  });

  it('places and turns one axis at a time, from the defaults when nothing was said', () => {
    expect(setPlace(sloped, 'body', 2, 12).solids[0]?.at).toEqual([0, 0, 12]);
    expect(setTurn(sloped, 'ramp', 0, 90).solids[1]?.turn).toEqual([90, 0, 180]);
  });

  it('copies beside the original under a name of its own', () => {
    const after = copySolid(sloped, 'ramp', 850);
    expect(after.solids.map(({ id }) => id)).toEqual(['body', 'ramp', 'ramp 2']);
    expect(after.solids[2]).toMatchObject({
      at: [1000, 0, 0],
      turn: [0, 0, 180],
      length: 850,
    });
    expect(freeId(after, 'ramp')).toBe('ramp 3');
  });

  it('refuses a name that is taken', () => {
    expect(renameSolid(sloped, 'ramp', 'body')).toBeNull();
    expect(renameSolid(sloped, 'ramp', 'floor')?.solids[1]?.id).toBe('floor');
  });

  it('says nothing of an attitude that is level, and takes a stick away whole', () => {
    expect(setAttitude(sloped, { pitch: 2, roll: 0 }).attitude).toEqual({
      pitch: 2,
      roll: 0,
    });
    expect('attitude' in setAttitude(sloped, { pitch: 0, roll: 0 })).toBe(false);
    expect('stick' in setStick(sloped, undefined)).toBe(false);
  });

  it('keeps what sizes are, with the wall, and forgets it whole', () => {
    const outside = setWall(sloped, { thickness: 6, sizes: 'outside' });
    expect(outside.wall).toEqual({ thickness: 6, sizes: 'outside' });
    expect(outside.solids).toBe(sloped.solids);
    expect(setWall(outside, { sizes: 'inside' }).wall).toEqual({ sizes: 'inside' });
    expect('wall' in setWall(outside, undefined)).toBe(false);
  });

  it('switches what a solid does and removes it', () => {
    expect(setRole(sloped, 'ramp', 'holds').solids[1]?.role).toBe('holds');
    expect(removeSolid(sloped, 'ramp').solids).toHaveLength(1);
  });
});

describe('scene', () => {
  it('undoes a named edit, and forgets a selection that is gone', () => {
    let scene = newScene(sloped);
    scene = sceneReducer(scene, { type: 'select', id: 'ramp' });
    scene = sceneReducer(scene, {
      type: 'edit',
      name: 'remove ramp',
      edit: (now) => removeSolid(now, 'ramp'),
    });
    expect(scene.selected).toBeNull();
    expect(scene.history.past[0]?.name).toBe('remove ramp');
    scene = sceneReducer(scene, { type: 'undo' });
    expect(scene.history.present).toBe(sloped);
  });
});
