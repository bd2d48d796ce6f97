import type { Solid } from '~/domain/tank/kinds/registry';

const it = { id: 'it', role: 'holds' } as const;

/** Options of the kinds drawn from flat faces and rounded edges that their blanks do not show. */
export const flatSolids: readonly Solid[] = [
  { ...it, kind: 'taper', bottom: [700, 90], top: [130, 410], height: 333, shift: [-450, 77] },
  {
    ...it,
    kind: 'prism',
    profile: [
      [0, 0, 80],
      [900, 0, 20],
      [900, 300, 150],
      [500, 300, 60],
      [450, 120, 35],
      [300, 500],
      [0, 350],
    ],
    width: 250,
  },
  {
    // with the clock, a gentle arc of a radius wider than all of it
    ...it,
    kind: 'prism',
    profile: [
      [0, 400],
      [700, 400],
      [700, 0],
      [350, -30, 1900],
      [0, 0],
    ],
    width: 600,
  },
  { ...it, kind: 'box', length: 700, width: 300, height: 420, edges: { y: 130 } },
  { ...it, kind: 'box', length: 700, width: 300, height: 420, edges: { x: 90, y: 40, z: 40 } },
  { ...it, kind: 'box', length: 700, width: 300, height: 420, edges: { x: 150, y: 150, z: 150 } },
  {
    // with the clock; twisted sides beside flat ones, a section that goes in
    ...it,
    kind: 'stations',
    stations: [
      {
        x: -50,
        profile: [
          [0, 0],
          [0, 300],
          [150, 140],
          [300, 300],
          [300, 0],
        ],
      },
      {
        x: 350,
        profile: [
          [0, 0],
          [-40, 320],
          [150, 60],
          [340, 320],
          [300, 0],
        ],
      },
      {
        x: 700,
        profile: [
          [20, 40],
          [-40, 320],
          [150, 60],
          [340, 320],
          [260, 10],
        ],
      },
    ],
  },
];
