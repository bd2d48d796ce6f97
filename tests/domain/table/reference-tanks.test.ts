import { describe, expect, it } from 'vitest';
import { computeTable } from '~/domain/table/compute-table';
import { box, cylinder, design } from './designs';

/** Worked outside the project: closed forms and adaptive quadrature in another language, doubles. */
describe('reference tanks, within 1e-7 of capacity', () => {
  it('lying cylinder 1900 × 4200, flat ends', async () => {
    const expected: readonly (readonly [number, number])[] = [
      [57, 104.09488392033454],
      [228, 809.4297258250248],
      [513, 2594.0606185902807],
      [779, 4596.928441800412],
      [950, 5954.103476716056],
      [1254, 8337.960680761662],
      [1577, 10565.830676379417],
      [1824, 11748.433771987504],
    ];
    const capacityL = 11908.206953432113;
    const tank = design([
      cylinder('s1', 1900, 4200, {
        axis: 'x',
        at: [-2100, -950, -950],
        ends: [{ form: 'flat' }, { form: 'flat' }],
      }),
    ]);
    const table = await computeTable(tank, { atMm: expected.map(([depth]) => depth) });
    expect(table.heightMm).toBe(1900);
    expect(Math.abs(table.capacityL / capacityL - 1)).toBeLessThan(1e-9);
    const worst = Math.max(
      ...table.rows.map(({ volumeL }, i) => Math.abs(volumeL - expected[i]![1])),
    );
    expect(worst / capacityL).toBeLessThan(1e-7);
    // the printed bound covers the true error
    expect(worst).toBeLessThan(table.errorL);
  });

  it('lying cylinder 2000 × 3600, torispherical ends: crown 2000, knuckle 200', async () => {
    const expected: readonly (readonly [number, number])[] = [
      [60, 103.66649473238587],
      [240, 834.4298575336242],
      [540, 2747.749226231526],
      [820, 4945.333276465533],
      [1000, 6446.594737406294],
      [1320, 9078.507799157167],
      [1660, 11494.348536589094],
      [1920, 12733.059722471704],
    ];
    const capacityL = 12893.189474812589;
    const end = { form: 'torisphere', crown: 2000, knuckle: 200 } as const;
    const tank = design([
      cylinder('s1', 2000, 3600, { at: [-2187.5484503402904, -1000, 0], ends: [end, end] }),
    ]);
    const table = await computeTable(tank, { atMm: expected.map(([depth]) => depth) });
    expect(table.heightMm).toBe(2000);
    expect(Math.abs(table.capacityL / capacityL - 1)).toBeLessThan(1e-9);
    const worst = Math.max(
      ...table.rows.map(({ volumeL }, i) => Math.abs(volumeL - expected[i]![1])),
    );
    expect(worst / capacityL).toBeLessThan(1e-7);
    // the printed bound covers the true error
    expect(worst).toBeLessThan(table.errorL);
  });

  it('box 1830 × 910 × 640, turned 15° and tilted about two axes', async () => {
    const expected: readonly (readonly [number, number])[] = [
      [25.941437595217906, 0.43768053977136245],
      [103.76575038087162, 27.05871069048802],
      [233.47293835696118, 199.43858228066244],
      [354.53298046797806, 402.41266263156365],
      [432.3572932536318, 532.8960000000002],
      [570.7116270947939, 764.866377543886],
      [717.7131068010287, 997.5325796779318],
      [830.126003046973, 1064.7545350168373],
    ];
    const tank = design(
      [box('s1', [1830, 910, 640], { at: [-910, -449, -313], turn: [0, 0, 15] })],
      {
        attitude: { pitch: -5.967369192703691, roll: 2.995896099163017 },
      },
    );
    const table = await computeTable(tank, { atMm: expected.map(([depth]) => depth) });
    expect(table.heightMm).toBeCloseTo(864.7145865072636, 9);
    expect(table.capacityL).toBeCloseTo(1065.792, 9);
    table.rows.forEach(({ volumeL }, i) => {
      expect(Math.abs(volumeL - expected[i]![1]) / 1065.792).toBeLessThan(1e-12);
    });
  });

  it('cylinder joined by a box that pokes through its top', async () => {
    const expected: readonly (readonly [number, number])[] = [
      [54, 46.9585166938518],
      [216, 361.9877728245033],
      [486, 1139.5793866805388],
      [738, 1974.8737417036796],
      [900, 2509.99826995956],
      [1188, 3342.1978998061218],
      [1494, 3797.4920889102304],
      [1728, 3965.9720889102305],
    ];
    const tank = design([
      cylinder('s1', 1400, 2400, { at: [-1200, -700, -700] }),
      box('s2', [900, 800, 1200], { at: [-250, -300, -100] }),
    ]);
    const table = await computeTable(tank, { atMm: expected.map(([depth]) => depth) });
    expect(table.heightMm).toBe(1800);
    expect(Math.abs(table.capacityL / 4017.8120889102306 - 1)).toBeLessThan(1e-7);
    table.rows.forEach(({ volumeL }, i) => {
      expect(Math.abs(volumeL - expected[i]![1]) / 4017.812).toBeLessThan(1e-7);
    });
  });
});
