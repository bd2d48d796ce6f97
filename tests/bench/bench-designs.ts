import { parseDesign } from '~/domain/tank/parse-design';
import type { TankDocument } from '~/domain/tank/document';

const head = { format: 'dipwright-tank', version: 1 };
const dished = { form: 'ellipsoid', depth: 200 };
const torisphere = { form: 'torisphere', crown: 800, knuckle: 80 };

/** What the engine is measured on: from one round solid to six with formed ends, tilted. */
export const benchDesigns: Readonly<Record<string, TankDocument>> = {
  'lying cylinder': parseDesign({
    ...head,
    name: 'lying cylinder',
    solids: [{ id: 'barrel', role: 'holds', kind: 'cylinder', diameter: 1400, length: 2400 }],
    stick: { at: [1200, 700] },
  }),
  'three solids, tilted': parseDesign({
    ...head,
    name: 'three solids, tilted',
    solids: [
      { id: 'barrel', role: 'holds', kind: 'cylinder', diameter: 1400, length: 2400 },
      {
        id: 'box',
        role: 'holds',
        kind: 'box',
        length: 900,
        width: 800,
        height: 1200,
        at: [950, 400, 600],
      },
      {
        id: 'column',
        role: 'displaces',
        kind: 'cylinder',
        diameter: 300,
        length: 1900,
        axis: 'z',
        at: [300, 500, -50],
      },
    ],
    attitude: { pitch: 3, roll: 2 },
    stick: { at: [1200, 700] },
  }),
  'six solids with formed ends, tilted': parseDesign({
    ...head,
    name: 'six solids with formed ends, tilted',
    solids: [
      {
        id: 'barrel',
        role: 'holds',
        kind: 'cylinder',
        diameter: 800,
        length: 1600,
        ends: [torisphere, torisphere],
      },
      {
        id: 'sump',
        role: 'holds',
        kind: 'cylinder',
        diameter: 300,
        length: 200,
        axis: 'z',
        at: [400, 250, -180],
        ends: [{ form: 'dish', depth: 60 }, { form: 'flat' }],
      },
      {
        id: 'dome',
        role: 'holds',
        kind: 'cylinder',
        diameter: 360,
        length: 160,
        axis: 'z',
        at: [1100, 220, 720],
        ends: [{ form: 'flat' }, { form: 'ellipsoid', depth: 90 }],
      },
      {
        id: 'saddle tank',
        role: 'holds',
        kind: 'cylinder',
        diameter: 500,
        length: 900,
        axis: 'x',
        at: [300, 500, 200],
        ends: [dished, dished],
      },
      {
        id: 'well',
        role: 'displaces',
        kind: 'cylinder',
        diameter: 90,
        length: 900,
        axis: 'z',
        at: [900, 300, -20],
      },
      {
        id: 'bulkhead',
        role: 'displaces',
        kind: 'box',
        length: 12,
        width: 800,
        height: 380,
        at: [1350, 0, 0],
      },
    ],
    attitude: { pitch: 3, roll: 2 },
    stick: { at: [700, 400] },
  }),
};
