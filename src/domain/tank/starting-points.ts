import type { TankDocument } from "./document";

/** Shapes of real life to begin from: whole documents, so that the first number stands at once. */
export interface StartingPoint {
  code: string;
  label: string;
  /** Where such a tank is met. */
  words: string;
  design: TankDocument;
}

const head = { format: "dipwright-tank", version: 1 } as const;

export const startingPoints: readonly StartingPoint[] = [
  {
    code: "plain-box",
    label: "Plain box",
    words: "upright walls, flat floor",
    design: {
      ...head,
      name: "Plain box",
      solids: [
        {
          id: "body",
          role: "holds",
          kind: "box",
          length: 800,
          width: 450,
          height: 300,
        },
      ],
      stick: { at: [400, 225] },
    },
  },
  {
    code: "sloped-floor",
    label: "Box with sloped floor",
    words: "drains to a sump at one end",
    design: {
      ...head,
      name: "Box with sloped floor",
      solids: [
        {
          id: "body",
          role: "holds",
          kind: "box",
          length: 1000,
          width: 450,
          height: 320,
        },
        {
          id: "ramp",
          role: "displaces",
          kind: "wedge",
          length: 850,
          width: 450,
          height: 70,
          at: [150, 0, 0],
          turn: [0, 0, 180],
        },
      ],
      stick: { at: [75, 225] },
    },
  },
  {
    code: "v-hull",
    label: "V hull",
    words: "keel down, sides falling in",
    design: {
      ...head,
      name: "V hull",
      solids: [
        {
          id: "port side",
          role: "holds",
          kind: "wedge",
          length: 300,
          width: 1200,
          height: 500,
          turn: [0, 180, 0],
        },
        {
          id: "starboard side",
          role: "holds",
          kind: "wedge",
          length: 300,
          width: 1200,
          height: 500,
          at: [300, 0, 0],
          turn: [180, 0, 0],
        },
      ],
      stick: { at: [300, 600] },
    },
  },
  {
    code: "lying-cylinder",
    label: "Lying cylinder",
    words: "round, on its side, flat ends",
    design: {
      ...head,
      name: "Lying cylinder",
      solids: [
        {
          id: "barrel",
          role: "holds",
          kind: "cylinder",
          diameter: 500,
          length: 1000,
        },
      ],
      stick: { at: [500, 250] },
    },
  },
  {
    code: "wheel-arch",
    label: "Box with wheel-arch cut-out",
    words: "beside a wheel in a van",
    design: {
      ...head,
      name: "Box with wheel-arch cut-out",
      solids: [
        {
          id: "body",
          role: "holds",
          kind: "box",
          length: 1100,
          width: 420,
          height: 380,
        },
        {
          id: "wheel arch",
          role: "displaces",
          kind: "box",
          length: 520,
          width: 240,
          height: 210,
          at: [290, 180, 0],
        },
      ],
      stick: { at: [145, 210] },
    },
  },
];
