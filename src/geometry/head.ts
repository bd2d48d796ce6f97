/**
 * An end of a round barrel in its own frame: the barrel's mouth is the disc of `radius` at place 0, the end stands
 * over it and is deepest on the axis. All mm.
 */
export type Head =
  | { form: 'flat'; radius: number }
  /** A cone with its tip on the axis. */
  | { form: 'cone'; radius: number; depth: number }
  /** A cap of a sphere, at most half of it. */
  | { form: 'dish'; radius: number; depth: number }
  /** Half a spheroid. */
  | { form: 'ellipsoid'; radius: number; depth: number }
  /** A cap of a sphere of radius `crown` that a ring of radius `knuckle` joins smoothly to the barrel. */
  | { form: 'torisphere'; radius: number; crown: number; knuckle: number };

/** Radius of the sphere that a dish is a cap of, mm: r² = S² − (S − depth)². */
export function dishSphere({ radius, depth }: { radius: number; depth: number }): number {
  return (radius * radius + depth * depth) / (2 * depth);
}

type Torisphere = Extract<Head, { form: 'torisphere' }>;

/**
 * Angle off the axis at which crown and knuckle meet, radians. Both spheres touch there from inside, so the knuckle's
 * centre, radius − knuckle off the axis, lies crown − knuckle from the crown's.
 */
export function knuckleAngle({ radius, crown, knuckle }: Torisphere): number {
  const off = radius - knuckle;
  return Math.atan2(off, Math.sqrt(Math.max((crown - radius) * (crown + radius - 2 * knuckle), 0)));
}

/** How far an end stands out of the barrel on the axis, mm. */
export function headDepth(head: Head): number {
  if (head.form === 'flat') return 0;
  if (head.form !== 'torisphere') return head.depth;
  const { radius, crown, knuckle } = head;
  return crown - Math.sqrt(Math.max((crown - radius) * (crown + radius - 2 * knuckle), 0));
}
