import type { NewInstallation } from '../../src/domain/installation/installation';
import type { TankDocument } from '../../src/domain/tank/document';
import type { TankStory } from './add-tank';

const head = { format: 'dipwright-tank', version: 1 } as const;
const day = 24;

/** Sump of 100 mm at the deep end, then a floor that rises 60 mm over 800 mm. 123 L. */
const cistern: TankDocument = {
  ...head,
  name: 'Drinking water cistern',
  solids: [
    { id: 'body', role: 'holds', kind: 'box', length: 900, width: 500, height: 300 },
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
  ],
  wall: { thickness: 6, sizes: 'inside' },
  stick: { at: [50, 250] },
};

/** V section, keel down: 600 wide at the top, 500 deep, 1200 long. 180 L. */
const hull: TankDocument = {
  ...head,
  name: 'Port diesel tank',
  solids: [
    {
      id: 'port side',
      role: 'holds',
      kind: 'wedge',
      length: 300,
      width: 1200,
      height: 500,
      turn: [0, 180, 0],
    },
    {
      id: 'starboard side',
      role: 'holds',
      kind: 'wedge',
      length: 300,
      width: 1200,
      height: 500,
      at: [300, 0, 0],
      turn: [180, 0, 0],
    },
  ],
  stick: { at: [300, 600] },
};

const freshWater: TankDocument = {
  ...head,
  name: 'Fresh water',
  solids: [
    { id: 'body', role: 'holds', kind: 'box', length: 1150, width: 400, height: 360 },
    {
      id: 'wheel arch',
      role: 'displaces',
      kind: 'box',
      length: 560,
      width: 230,
      height: 200,
      at: [300, 170, 0],
    },
  ],
  wall: { thickness: 8, sizes: 'inside' },
  stick: { at: [150, 200] },
};

const greyWater: TankDocument = {
  ...head,
  name: 'Grey water',
  solids: [{ id: 'barrel', role: 'holds', kind: 'cylinder', diameter: 340, length: 900 }],
  stick: { at: [450, 170] },
};

/** Lying cylinder, flat ends. 2261.9 L. */
const heatingOil: TankDocument = {
  ...head,
  name: 'Heating oil',
  solids: [{ id: 'barrel', role: 'holds', kind: 'cylinder', diameter: 1200, length: 2000 }],
  stick: { at: [1000, 600] },
};

const nothingMore = { issues: [], handedOver: false, readings: [] } as const;

/** What Tarnside Outfitters has fitted, and what is still on the bench. */
export const demoInstallations: readonly (NewInstallation & { tanks: readonly TankStory[] })[] = [
  {
    name: 'High Tarn hut',
    kind: 'place',
    tanks: [
      {
        name: 'Drinking water cistern',
        liquid: 'drinking-water',
        design: cistern,
        issues: [
          {
            hoursAgo: 30 * day,
            stepMm: 10,
            note: 'Measured inside with a tape before the lid went on.',
          },
        ],
        handedOver: true,
        readings: [
          { hoursAgo: 21 * day, depthMm: 296, by: 'fitter', note: 'Filled at handover.' },
          { hoursAgo: 14 * day, depthMm: 231, by: 'owner' },
          { hoursAgo: 6 * day, depthMm: 174, by: 'owner' },
          { hoursAgo: day, depthMm: 150, by: 'owner', note: 'Two nights, four people.' },
        ],
      },
      {
        name: 'Heating oil',
        liquid: 'heating-oil',
        design: heatingOil,
        settings: { safeFillPercent: 97, measuredBy: 'drawing' },
        issues: [{ hoursAgo: 29 * day, stepMm: 10 }],
        handedOver: true,
        readings: [
          { hoursAgo: 2 * day, depthMm: 419, by: 'owner', note: 'Stick showed 16 4/8 in.' },
        ],
      },
    ],
  },
  {
    name: 'Workboat Skua',
    kind: 'boat',
    tanks: [
      {
        name: 'Port diesel tank',
        liquid: 'diesel',
        design: hull,
        settings: { safeFillPercent: 95 },
        issues: [
          { hoursAgo: 40 * day, stepMm: 10 },
          {
            hoursAgo: 12 * day,
            change: { outletMm: 40, referenceHeightMm: 612 },
            stepMm: 10,
            note: 'Pick-up found 40 mm above the keel; reference height measured.',
          },
        ],
        handedOver: true,
        readings: [{ hoursAgo: 3 * day, depthMm: 250, by: 'owner' }],
      },
    ],
  },
  {
    name: 'Service van 3',
    kind: 'vehicle',
    tanks: [{ name: 'Fresh water', liquid: 'drinking-water', design: freshWater, ...nothingMore }],
  },
  {
    name: 'Service van 7',
    kind: 'vehicle',
    tanks: [
      {
        ...nothingMore,
        name: 'Grey water',
        liquid: 'grey-water',
        design: greyWater,
        issues: [{ hoursAgo: 8 * day, stepMm: 10 }],
      },
    ],
  },
];
