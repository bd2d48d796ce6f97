import { LessEqualDepth, GreaterDepth, type Vector2 } from 'three';
import { LineMaterial } from 'three/addons/lines/LineMaterial.js';
import { LineSegments2 } from 'three/addons/lines/LineSegments2.js';
import { LineSegmentsGeometry } from 'three/addons/lines/LineSegmentsGeometry.js';

export interface LineStyle {
  colour: string;
  widthPx: number;
  /** visible: in front of faces; hidden: behind them; always: whatever stands before. */
  where: 'visible' | 'hidden' | 'always';
  order: number;
}

/** Segments (six numbers each, world px) as lines of a constant width on the screen. */
export function fatLines(segments: Float32Array, style: LineStyle, resolution: Vector2) {
  const geometry = new LineSegmentsGeometry();
  geometry.setPositions(segments);
  const material = new LineMaterial({
    color: style.colour,
    linewidth: style.widthPx,
    depthTest: style.where !== 'always',
    depthWrite: false,
    depthFunc: style.where === 'hidden' ? GreaterDepth : LessEqualDepth,
  });
  material.resolution.copy(resolution);
  const lines = new LineSegments2(geometry, material);
  lines.renderOrder = style.order;
  lines.frustumCulled = false;
  return lines;
}
