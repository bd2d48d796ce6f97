import { z } from 'zod/v4';
import { tankDocument } from './document';
import { liquidCode, tankSettings } from './settings';

const tankName = z.string().trim().min(1, 'Name the tank.').max(120, 'A name has at most 120 characters.');

/** POST /api/v1/tanks */
export const newTank = z.strictObject({
  installationId: z.string().min(1, 'Choose an installation.').max(64),
  name: tankName,
  liquid: liquidCode,
  design: tankDocument.optional(),
  settings: tankSettings.partial().omit({ liquid: true }).optional(),
});
export type NewTank = z.infer<typeof newTank>;

/** PATCH /api/v1/tanks/{id}: any of its name and settings. */
export const tankChange = tankSettings.partial().extend({ name: tankName.optional() });
export type TankChange = z.infer<typeof tankChange>;

export const revisionSummary = z.object({
  id: z.string(),
  letter: z.string(),
  issuedAt: z.string(),
  issuedBy: z.string(),
  note: z.string().nullable(),
  stepMm: z.number(),
  heightMm: z.number(),
  capacityL: z.number(),
  errorL: z.number(),
  hash: z.string(),
  /** false once a later letter stands. */
  current: z.boolean(),
});
export type RevisionSummary = z.infer<typeof revisionSummary>;

export const tank = z.object({
  id: z.string(),
  installationId: z.string(),
  installationName: z.string(),
  name: z.string(),
  settings: tankSettings,
  /** The current revision, null while only a draft stands. */
  revision: revisionSummary.nullable(),
  /** True when the draft differs from the current revision. An owner is not told (false). */
  draftDiffers: z.boolean(),
});
export type Tank = z.infer<typeof tank>;

/** POST /api/v1/tanks/{id}/revisions */
export const newRevision = z.strictObject({
  stepMm: z.number('Give the step of the table in millimetres.').min(0.5, 'A step is 0.5 mm or more.').max(1000, 'A step is at most 1000 mm.'),
  note: z.string().trim().max(500, 'A note has at most 500 characters.').optional(),
});
export type NewRevision = z.infer<typeof newRevision>;

/** GET /api/v1/revisions/{id}/volume */
export const lookUp = z.object({
  depthMm: z.number(),
  ullageMm: z.number(),
  volumeL: z.number(),
  usableL: z.number(),
  roomL: z.number(),
  massKg: z.number(),
  plusMinusL: z.number(),
  surfaceCm2: z.number(),
  /** Letter of the revision that says so. */
  revision: z.string(),
  current: z.boolean(),
});
export type LookUp = z.infer<typeof lookUp>;
