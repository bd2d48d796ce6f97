import type { TankDocument } from '~/domain/tank/document';
import { upVector } from '~/geometry/attitude';

/**
 * dLevel/dReading: u·z, the share of a millimetre of stick by which the liquid's level rises, with u
 * the unit up vector in the tank's frame; without a stick depth is plumb height, so 1.
 * Dimensionless, in (0, 1].
 */
export function levelPerReading({ stick, attitude }: TankDocument): number {
  if (stick === undefined || attitude === undefined) return 1;
  return upVector(attitude.pitch, attitude.roll)[2];
}
