import type { TankDocument } from '~/domain/tank/document';

/**
 * dLevel/dReading: u·z, the share of a millimetre of stick by which the liquid's level rises. u is
 * the unit up vector (−tan pitch, −tan roll, 1)/norm in the tank's frame; without a stick depth is
 * plumb height, so 1. Dimensionless, in (0, 1].
 */
export function levelPerReading({ stick, attitude }: TankDocument): number {
  if (stick === undefined || attitude === undefined) return 1;
  const slope = (degrees: number): number => Math.tan((degrees * Math.PI) / 180);
  return 1 / Math.hypot(slope(attitude.pitch), slope(attitude.roll), 1);
}
