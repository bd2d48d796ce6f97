import { DoubleSide, MeshBasicMaterial, type Material, type Plane, type Side } from 'three';
import { hatchMaterial, type HatchPattern } from './hatch-material';
import type { Ink } from './ink';

const behindEdges = {
  polygonOffset: true,
  polygonOffsetFactor: 1,
  polygonOffsetUnits: 2,
};

/** Flat colour without light, kept a hair behind the edges drawn upon it. */
export function fill(colour: string, side: Side, clippingPlanes: Plane[], depth: boolean) {
  return new MeshBasicMaterial({
    color: colour,
    side,
    clippingPlanes,
    depthTest: depth,
    depthWrite: depth,
    ...behindEdges,
  });
}

export function depthOnly(): Material {
  return new MeshBasicMaterial({
    colorWrite: false,
    side: DoubleSide,
    ...behindEdges,
  });
}

/** The surface seen from above: the liquid's tone, half way to the film. */
export function surfaceTone(ink: Ink): string {
  const mix = (i: number) =>
    Math.round(
      (parseInt(ink.wash.slice(i, i + 2), 16) + parseInt(ink.film.slice(i, i + 2), 16)) / 2,
    )
      .toString(16)
      .padStart(2, '0');
  return `#${mix(1)}${mix(3)}${mix(5)}`;
}

export function hatch(pattern: HatchPattern, colour: string, planes: Plane[], pixelRatio: number) {
  const material = hatchMaterial(pattern, colour, planes);
  material.uniforms.pixelRatio!.value = pixelRatio;
  return material;
}
