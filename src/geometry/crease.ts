/**
 * Cosine of the angle, 24°, below which two faces that meet are one curved face to the eye: no line is drawn between
 * them. Above the 22.5° between the facets of the coarsest turn that is drawn, one of sixteen.
 */
export const creaseCos = Math.cos((24 * Math.PI) / 180);
