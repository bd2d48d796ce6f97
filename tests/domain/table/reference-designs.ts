import type { TankDocument } from '~/domain/tank/document';
import { box, cylinder, design } from './designs';

/** A tank whose litres were worked outside the project. */
export interface ReferenceTank {
  name: string;
  tank: TankDocument;
  capacityL: number;
  heightMm: number;
  rows: readonly (readonly [depthMm: number, volumeL: number])[];
}

/** Worked by closed forms and adaptive quadrature in another language, doubles: five tanks, eight readings each. */
export const referenceTanks: readonly ReferenceTank[] = [
  {
    name: 'lying cylinder 1900 × 4200, flat ends',
    tank: design([cylinder('s1', 1900, 4200, { axis: 'x', at: [-2100, -950, -950] })]),
    capacityL: 11908.206953432113,
    heightMm: 1900,
    rows: [
      [57, 104.09488392033454],
      [228, 809.4297258250248],
      [513, 2594.0606185902807],
      [779, 4596.928441800412],
      [950, 5954.103476716056],
      [1254, 8337.960680761662],
      [1577, 10565.830676379417],
      [1824, 11748.433771987504],
    ],
  },
  {
    name: 'lying cylinder 2000 × 3600, torispherical ends: crown 2000, knuckle 200',
    tank: design([
      cylinder('s1', 2000, 3600, {
        axis: 'x',
        at: [-2187.5484503402904, -1000, 0],
        ends: [
          { form: 'torisphere', crown: 2000, knuckle: 200 },
          { form: 'torisphere', crown: 2000, knuckle: 200 },
        ],
      }),
    ]),
    capacityL: 12893.189474812589,
    heightMm: 2000,
    rows: [
      [60, 103.66649473238587],
      [240, 834.4298575336242],
      [540, 2747.749226231526],
      [820, 4945.333276465533],
      [1000, 6446.594737406294],
      [1320, 9078.507799157167],
      [1660, 11494.348536589094],
      [1920, 12733.059722471704],
    ],
  },
  {
    name: 'box 1830 × 910 × 640, turned 15° and tilted about two axes',
    tank: design([box('s1', [1830, 910, 640], { at: [-910, -449, -313], turn: [0, 0, 15] })], {
      attitude: { pitch: -5.967369192703691, roll: 2.995896099163017 },
    }),
    capacityL: 1065.7919999999958,
    heightMm: 864.7145865072636,
    rows: [
      [25.941437595217906, 0.43768053977136245],
      [103.76575038087162, 27.05871069048802],
      [233.47293835696118, 199.43858228066244],
      [354.53298046797806, 402.41266263156365],
      [432.3572932536318, 532.8960000000002],
      [570.7116270947939, 764.866377543886],
      [717.7131068010287, 997.5325796779318],
      [830.126003046973, 1064.7545350168373],
    ],
  },
  {
    name: 'cylinder joined by a box that pokes through its top',
    tank: design([
      cylinder('s1', 1400, 2400, { axis: 'x', at: [-1200, -700, -700] }),
      box('s2', [900, 800, 1200], { at: [-250, -300, -100] }),
    ]),
    capacityL: 4017.8120889102306,
    heightMm: 1800,
    rows: [
      [54, 46.9585166938518],
      [216, 361.9877728245033],
      [486.00000000000006, 1139.5793866805388],
      [738, 1974.8737417036796],
      [900, 2509.99826995956],
      [1188, 3342.1978998061218],
      [1494, 3797.4920889102304],
      [1728, 3965.9720889102305],
    ],
  },
  {
    name: 'cone under a cylinder that share a face: a hopper, both turned upright',
    tank: design([
      cylinder('s1', 1800, 1500, { axis: 'x', at: [-750, -900, 750], turn: [0, -90, 0] }),
      {
        id: 's2',
        role: 'holds',
        kind: 'cone',
        start: 300,
        end: 1800,
        length: 900,
        axis: 'x',
        at: [-450, -900, -450],
        turn: [0, -90, 0],
      },
    ]),
    capacityL: 4728.8823418160355,
    heightMm: 2400,
    rows: [
      [72, 7.396565743611809],
      [288, 70.30130376497094],
      [648, 408.57543433290556],
      [983.9999999999999, 1125.6012318546868],
      [1200, 1675.2542825267572],
      [1584, 2652.4152614993263],
      [1992, 3690.648801657681],
      [2304, 4484.592097072893],
    ],
  },
];
