import { describe, expect, it } from 'vitest';
import { mmPerFoot, mmPerInch } from '~/domain/units/length-unit';
import { litresPerImperialGallon, litresPerUsGallon } from '~/domain/units/volume-unit';

describe('exact constants', () => {
  it('a US gallon is 231 cubic inches exactly', () => {
    // NIST Handbook 44, App. C: "1 gallon (U.S.) 231 cubic inches (exactly)"; 1 L = 1e6 mm³
    expect(litresPerUsGallon).toBeCloseTo((231 * mmPerInch ** 3) / 1e6, 12);
    expect(litresPerUsGallon).toBe(3.785411784);
  });

  it('an imperial gallon is 4.54609 L exactly', () => {
    // Weights and Measures Act 1985 (c. 72) Sch. 1; Oxford Reference, "gallon"
    expect(litresPerImperialGallon).toBe(4.54609);
  });

  it('an inch is 25.4 mm and a yard 0.9144 m', () => {
    // international yard and pound agreement of 1959; NIST SP 811, App. B
    expect(mmPerInch).toBe(25.4);
    expect(mmPerFoot * 3).toBeCloseTo(914.4, 12);
  });

  it('a plate of 55 gallons: 208.2 L when US, 250.0 L when imperial', () => {
    // worked by hand: 55 × 3.785411784 and 55 × 4.54609
    expect(55 * litresPerUsGallon).toBeCloseTo(208.198, 3);
    expect(55 * litresPerImperialGallon).toBeCloseTo(250.035, 3);
  });
});
