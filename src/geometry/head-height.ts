import { dishSphere, headDepth, knuckleAngle, type Head } from './head';

/** Place of an end's surface over the barrel's mouth at a distance r from the axis, 0 ≤ r ≤ radius. mm */
export function headHeight(head: Head, r: number): number {
  switch (head.form) {
    case 'flat':
      return 0;
    case 'cone':
      return head.depth * (1 - r / head.radius);
    case 'dish':
      return overSphere(dishSphere(head), head.depth, r);
    case 'ellipsoid':
      return head.depth * Math.sqrt(Math.max(1 - (r / head.radius) ** 2, 0));
    case 'torisphere': {
      const { radius, crown, knuckle } = head;
      if (r <= crown * Math.sin(knuckleAngle(head))) return overSphere(crown, headDepth(head), r);
      return Math.sqrt(Math.max(knuckle ** 2 - (r - radius + knuckle) ** 2, 0));
    }
  }
}

function overSphere(sphere: number, depth: number, r: number): number {
  // S − √(S² − r²) without loss where the sphere is large
  return depth - (r * r) / (sphere + Math.sqrt(Math.max(sphere * sphere - r * r, 0)));
}
