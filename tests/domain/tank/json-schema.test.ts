import { readFile } from 'node:fs/promises';
import { describe, expect, it } from 'vitest';
import { tankJsonSchema } from '~/domain/tank/json-schema';

describe('the published JSON Schema', () => {
  it('is the one the validating schema gives (renew with: npx vitest run tests/domain/tank -u)', async () => {
    const text = `${JSON.stringify(tankJsonSchema(), null, 2)}\n`;
    await expect(text).toMatchFileSnapshot('../../../docs/dipwright-tank.schema.json');
  });

  it('names every kind and closes every object', async () => {
    const schema = JSON.parse(await readFile('docs/dipwright-tank.schema.json', 'utf8')) as {
      additionalProperties: boolean;
      required: string[];
      properties: { solids: { maxItems: number; items: { oneOf: { properties: { kind: { const: string } } }[] } } };
    };
    expect(schema.additionalProperties).toBe(false);
    expect(schema.required).toEqual(['format', 'version', 'name', 'solids']);
    expect(schema.properties.solids.maxItems).toBe(200);
    const kinds = schema.properties.solids.items.oneOf.map(({ properties }) => properties.kind.const);
    expect(kinds).toEqual(expect.arrayContaining(['box', 'cylinder', 'wedge']));
  });
});
