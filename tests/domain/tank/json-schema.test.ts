import { describe, expect, it } from 'vitest';
import { tankJsonSchema } from '~/domain/tank/json-schema';
import { kinds } from '~/domain/tank/kinds/registry';

describe('the published JSON Schema', () => {
  it('is the one the validating schema gives (renew with: npx vitest run tests/domain/tank -u)', async () => {
    const text = `${JSON.stringify(tankJsonSchema(), null, 2)}\n`;
    await expect(text).toMatchFileSnapshot('../../../docs/dipwright-tank.schema.json');
  });

  it('names every kind and closes every object and list', () => {
    const schema = tankJsonSchema() as unknown as {
      additionalProperties: boolean;
      required: string[];
      properties: {
        solids: {
          maxItems: number;
          items: { anyOf: { properties: { kind: { const: string } } }[] };
        };
        outlet: { prefixItems: unknown[]; minItems: number; items: boolean };
      };
    };
    expect(schema.additionalProperties).toBe(false);
    expect(schema.required).toEqual(['format', 'version', 'name', 'solids']);
    const { solids, outlet } = schema.properties;
    expect(solids.maxItems).toBe(200);
    expect(solids.items.anyOf.map(({ properties }) => properties.kind.const)).toEqual(
      [...kinds.map(({ kind }) => kind as string), 'mesh'],
    );
    expect(outlet).toMatchObject({ minItems: 3, items: false });
  });
});
