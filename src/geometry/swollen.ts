import type { Shape } from './shape';

/**
 * A round shape with its radius grown by `mm` (shrunk when negative), flat ends and length unchanged. A flat
 * outline is moved out from its middle, which is right for a circle and near enough for an ellipse.
 */
export function swollen(shape: Shape, mm: number): Shape {
  if (shape.form === 'revolution') {
    return {
      ...shape,
      profile: shape.profile.map(([radius, place]) => [grown(radius, mm), place]),
    };
  }
  const outline = shape.outline.map(([a, b]) => {
    const radius = Math.hypot(a, b);
    const factor = grown(radius, mm) / radius;
    return [a * factor, b * factor] as const;
  });
  return { ...shape, outline };
}

function grown(radius: number, mm: number): number {
  return radius === 0 ? 0 : Math.max(radius + mm, radius / 2);
}
