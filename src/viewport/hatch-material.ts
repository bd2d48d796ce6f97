import { Color, DoubleSide, FrontSide, ShaderMaterial, type Plane } from 'three';

export type HatchPattern = 'unusable' | 'headroom' | 'deadwood';

const patternCode: Record<HatchPattern, number> = {
  unusable: 0,
  headroom: 1,
  deadwood: 2,
};

/**
 * A face filled with a drawing pattern that keeps its spacing on the screen (CSS px), as ruled by
 * hand on the finished drawing: cross-hatch, sparse dots or diagonal rule. See-through between.
 */
export function hatchMaterial(
  pattern: HatchPattern,
  colour: string,
  clippingPlanes: Plane[] = [],
): ShaderMaterial {
  return new ShaderMaterial({
    uniforms: {
      colour: { value: new Color(colour) },
      pattern: { value: patternCode[pattern] },
      pixelRatio: { value: 1 },
    },
    vertexShader: /* glsl */ `
      #include <clipping_planes_pars_vertex>
      void main() {
        #include <begin_vertex>
        #include <project_vertex>
        #include <clipping_planes_vertex>
      }`,
    fragmentShader: /* glsl */ `
      uniform vec3 colour;
      uniform int pattern;
      uniform float pixelRatio;
      #include <clipping_planes_pars_fragment>
      float rule(float along, float spacing, float width) {
        float d = abs(mod(along, spacing) - 0.5 * spacing);
        return 1.0 - smoothstep(0.5 * width - 0.35, 0.5 * width + 0.35, d);
      }
      void main() {
        #include <clipping_planes_fragment>
        vec2 p = gl_FragCoord.xy / pixelRatio;
        float cover;
        if (pattern == 1) {
          vec2 q = vec2(p.x + 5.0 * mod(floor(p.y / 5.0), 2.0), p.y);
          vec2 d = vec2(mod(q.x, 10.0) - 5.0, mod(q.y, 5.0) - 2.5);
          cover = 1.0 - smoothstep(0.6, 1.2, length(d));
        } else {
          cover = rule((p.x - p.y) * 0.70711, 5.5, 0.9);
          if (pattern == 0) cover = max(cover, rule((p.x + p.y) * 0.70711, 5.5, 0.9));
        }
        if (cover < 0.02) discard;
        gl_FragColor = vec4(colour, cover);
        #include <colorspace_fragment>
      }`,
    clipping: true,
    clippingPlanes,
    transparent: true,
    depthTest: false,
    depthWrite: false,
    side: pattern === 'deadwood' ? DoubleSide : FrontSide,
  });
}
