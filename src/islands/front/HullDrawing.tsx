import { useMemo } from 'react';
import { levelOfReading } from '~/domain/table/level';
import type { Preview } from '~/domain/table/preview';
import type { Vec3 } from '~/domain/tank/solid';
import { edgesOf, type EdgeList } from '~/viewport/drawn-edges';
import { onPlate, project, type Plate, type Projection } from '~/viewport/projection';
import { facesBetween, surfaceLoops } from '~/viewport/slice-mesh';
import { Patterns } from '../stick/Patterns';

/**
 * The tank drawn away at the stick's own scale, as plain SVG: its edges, the liquid up to the
 * reading, the surface in datum red, what is unusable hatched and the headroom dotted.
 */
export function HullDrawing({
  preview,
  readingMm,
  unusableMm,
  safeFillMm,
  plate,
  prefix,
}: {
  preview: Preview;
  readingMm: number;
  unusableMm: number;
  safeFillMm: number | null;
  plate: Plate;
  /** Of the patterns' ids. */
  prefix: string;
}) {
  const { space, frame } = preview;
  const projection = useMemo(
    () => project(space, frame, { name: 'away' }, plate),
    [space, frame, plate],
  );
  const lines = useMemo(() => linesOf(edgesOf(space), projection), [space, projection]);
  const level = levelOfReading(frame, readingMm);
  const outlet = levelOfReading(frame, Math.min(unusableMm, readingMm));
  const wet = facesBetween(space, frame.up, -Infinity, level);
  const surface = surfaceLoops(space, frame.up, level);
  const unusable = facesBetween(space, frame.up, -Infinity, outlet);
  const headroom =
    safeFillMm === null
      ? []
      : facesBetween(
          space,
          frame.up,
          levelOfReading(frame, Math.max(safeFillMm, readingMm)),
          Infinity,
        );
  const d = (polygons: readonly Vec3[][]) => filled(polygons, projection);
  return (
    <svg width={plate.width} height={plate.height} aria-hidden="true" className="block">
      <Patterns prefix={prefix} />
      <path d={lines.hidden} className="stroke-line" strokeWidth="0.75" fill="none" />
      <path d={d(headroom)} fill={`url(#${prefix}-headroom)`} />
      <path d={d(wet) + d(surface)} className="fill-wash" />
      <path d={d(unusable)} fill={`url(#${prefix}-unusable)`} />
      <path d={lines.hidden} className="stroke-line" strokeWidth="0.75" fill="none" />
      <path
        d={outlined(surface, projection)}
        className="stroke-datum"
        strokeWidth="1.25"
        fill="none"
      />
      <path
        d={lines.seen}
        className="stroke-ink"
        strokeWidth="1.75"
        strokeLinecap="round"
        fill="none"
      />
    </svg>
  );
}

/** Hidden edges apart from those that the reader sees. */
function linesOf(edges: EdgeList, projection: Projection): { seen: string; hidden: string } {
  const seen: string[] = [];
  const hidden: string[] = [];
  const [tx, ty, tz] = projection.towards;
  edges.crease.forEach((crease, e) => {
    const looks = [0, 3].map((k) => {
      const i = 6 * e + k;
      return (
        edges.normals[i]! * tx + edges.normals[i + 1]! * ty + edges.normals[i + 2]! * tz > 1e-9
      );
    });
    const outline = looks[0] !== looks[1];
    if (crease === 0 && !outline) return;
    const end = (k: number): string => {
      const i = 6 * e + k;
      return point(projection, [
        edges.segments[i]!,
        edges.segments[i + 1]!,
        edges.segments[i + 2]!,
      ]);
    };
    (outline || looks[0] ? seen : hidden).push(`M${end(0)}L${end(3)}`);
  });
  return { seen: seen.join(''), hidden: hidden.join('') };
}

/** Polygons as one path, all turning the same way so that overlaps fill as one. */
function filled(polygons: readonly Vec3[][], projection: Projection): string {
  return polygons
    .map((polygon) => {
      const flat = polygon.map((p) => onPlate(projection, p));
      const area = flat.reduce((sum, [x, y], i) => {
        const [nx, ny] = flat[(i + 1) % flat.length]!;
        return sum + x * ny - nx * y;
      }, 0);
      const turned = area < 0 ? flat.reverse() : flat;
      return `M${turned.map(([x, y]) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`;
    })
    .join('');
}

function outlined(loops: readonly Vec3[][], projection: Projection): string {
  return loops.map((loop) => `M${loop.map((p) => point(projection, p)).join('L')}Z`).join('');
}

function point(projection: Projection, p: Vec3): string {
  const [x, y] = onPlate(projection, p);
  return `${x.toFixed(1)} ${y.toFixed(1)}`;
}
