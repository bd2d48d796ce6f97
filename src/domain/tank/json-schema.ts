import { z } from 'zod/v4';
import { tankDocument } from './document';

/**
 * The design document as JSON Schema (draft 2020-12), as published in docs/dipwright-tank.schema.json. What
 * it cannot say: ids are given once; the stick stands over the liquid space; the space is not empty.
 */
export function tankJsonSchema(): object {
  return {
    ...z.toJSONSchema(tankDocument, {
      io: 'input',
      override({ zodSchema, jsonSchema }) {
        // a place has three numbers, not at least three; the radius of a corner may be left out
        if (zodSchema._zod.def.type !== 'tuple') return;
        const { items } = zodSchema._zod.def as unknown as z.core.$ZodTupleDef;
        jsonSchema.minItems = items.filter(({ _zod }) => _zod.optin !== 'optional').length;
        jsonSchema.items = false;
      },
    }),
    title: 'Dipwright tank design, version 1',
    description: 'Lengths in millimetres, angles in degrees, z up when the tank stands level.',
  };
}
