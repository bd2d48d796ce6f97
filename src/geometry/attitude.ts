import type { Vec3 } from './vec3';
import { unit } from './vec3';

/**
 * The unit up vector in the tank's frame: up = (−tan pitch, −tan roll, 1), normalised. A level laid
 * along x reads `pitch`, positive when the +x end is lower; along y `roll`, positive when the +y end
 * is lower. Degrees within ± 60; level gives exactly (0, 0, 1).
 */
export function upVector(pitchDegrees: number, rollDegrees: number): Vec3 {
  if (pitchDegrees === 0 && rollDegrees === 0) return [0, 0, 1];
  return unit([tangent(-pitchDegrees), tangent(-rollDegrees), 1]);
}

function tangent(degrees: number): number {
  return Math.tan((degrees * Math.PI) / 180);
}
