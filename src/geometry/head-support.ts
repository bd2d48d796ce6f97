import { dishSphere, headDepth, knuckleAngle, type Head } from './head';

/**
 * Greatest across·r + along·z over the surface of an end, mm, closed form; r the distance from the axis, z the place
 * over the barrel's mouth, (across, along) a unit vector with across ≥ 0.
 */
export function headSupport(head: Head, across: number, along: number): number {
  const rim = across * head.radius;
  if (along <= 0) return rim;
  switch (head.form) {
    case 'flat':
      return rim;
    case 'cone':
      return Math.max(rim, along * head.depth);
    case 'dish': {
      const sphere = dishSphere(head);
      return across * sphere <= head.radius ? sphere + along * (head.depth - sphere) : rim;
    }
    case 'ellipsoid':
      return Math.hypot(rim, along * head.depth);
    case 'torisphere': {
      const { radius, crown, knuckle } = head;
      return Math.atan2(across, along) <= knuckleAngle(head)
        ? crown + along * (headDepth(head) - crown)
        : across * (radius - knuckle) + knuckle;
    }
  }
}
