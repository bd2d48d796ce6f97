import { dishSphere, knuckleAngle, type Head } from './head';

/**
 * Volume of an end between the barrel's mouth and its surface, mm³, closed form. The torisphere: with c = radius − knuckle
 * and the joint at the angle t off the axis, a cap of height crown·(1 − cos t) and, below the joint at the place
 * z = knuckle·cos t, π∫(c + √(k² − s²))² ds = π((c² + k²)z − z³/3 + c(z·k·sin t + k²(π/2 − t))).
 */
export function headVolume(head: Head): number {
  const { radius } = head;
  switch (head.form) {
    case 'flat':
      return 0;
    case 'cone':
      return (Math.PI * radius * radius * head.depth) / 3;
    case 'dish':
      return cap(dishSphere(head), head.depth);
    case 'ellipsoid':
      return (2 * Math.PI * radius * radius * head.depth) / 3;
    case 'torisphere': {
      const { crown, knuckle: k } = head;
      const c = radius - k;
      const t = knuckleAngle(head);
      const z = k * Math.cos(t);
      const ring =
        (c * c + k * k) * z - z ** 3 / 3 + c * (z * k * Math.sin(t) + k * k * (Math.PI / 2 - t));
      // 1 − cos t without loss where the crown is nearly flat
      return cap(crown, 2 * crown * Math.sin(t / 2) ** 2) + Math.PI * ring;
    }
  }
}

function cap(sphere: number, height: number): number {
  return (Math.PI * height * height * (3 * sphere - height)) / 3;
}
