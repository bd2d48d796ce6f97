import { z } from 'zod/v4';
import { handover } from '~/domain/access/handover';
import { me, member } from '~/domain/access/member';
import { installation } from '~/domain/installation/installation';
import { reading } from '~/domain/reading/reading';
import { depthAnswer } from '~/domain/table/depth-answer';
import { computedTable, issuedRow } from '~/domain/table/request';
import { tankDocument } from '~/domain/tank/document';
import { tankSettings } from '~/domain/tank/settings';
import { lookUp, revisionSummary, tank } from '~/domain/tank/tank';
import type { Answer, Operation } from '../http/operation';
import { operations } from './operations';
import { problemSchema } from './problem-schema';

type Json = Record<string, unknown>;

/** Shapes that the document names once and refers to. */
const named = z.registry<{ id: string }>();
const shapes = {
  Handover: handover,
  Me: me,
  Member: member,
  Installation: installation,
  Reading: reading,
  DepthAnswer: depthAnswer,
  ComputedTable: computedTable,
  IssuedRow: issuedRow,
  TankDocument: tankDocument,
  TankSettings: tankSettings,
  LookUp: lookUp,
  RevisionSummary: revisionSummary,
  Tank: tank,
  Problem: problemSchema,
};
for (const [id, schema] of Object.entries(shapes)) named.add(schema, { id });

/** The OpenAPI 3.1 document, made from the table of operations and the schemas that validate. */
export function openApiDocument(origin: string, version: string): Json {
  const { schemas } = z.toJSONSchema(named, { uri: refTo, io: 'input', unrepresentable: 'any' });
  const paths: Record<string, Json> = {};
  for (const operation of operations) {
    paths[operation.path] = {
      ...paths[operation.path],
      [operation.method.toLowerCase()]: described(operation),
    };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Dipwright',
      version,
      description:
        'True litres for odd-shaped tanks. Lengths are millimetres and volumes litres, as the names say. ' +
        'Refusals are problem+json (RFC 9457). Not for trade or fiscal measurement.',
    },
    servers: [{ url: origin }],
    paths,
    components: {
      schemas: Object.fromEntries(
        Object.entries(schemas).map(([id, schema]) => [id, withoutMeta(schema)]),
      ),
      securitySchemes: {
        session: {
          type: 'apiKey',
          in: 'cookie',
          name: origin.startsWith('https:') ? '__Host-dipwright' : 'dipwright',
          description: `Set by POST /api/v1/session. A program that sends it with POST, PUT, PATCH or DELETE adds the header "Origin: ${origin}".`,
        },
      },
    },
  };
}

function described(operation: Operation): Json {
  const { id, tag, summary, access, body, sends, answers } = operation;
  return {
    operationId: id,
    tags: [tag],
    summary,
    security: access === 'member' ? [{ session: [] }] : [],
    parameters: parametersOf(operation),
    ...(body === undefined
      ? {}
      : {
          requestBody: {
            required: true,
            content: { 'application/json': { schema: shapeOf(body, 'input') } },
          },
        }),
    ...(sends === undefined
      ? {}
      : {
          requestBody: {
            required: true,
            content: { [sends]: { schema: { type: 'string', format: 'binary' } } },
          },
        }),
    responses: {
      ...Object.fromEntries(answers.map((answer) => [String(answer.status), responseOf(answer)])),
      default: {
        description: `Refused: problem+json with the status ${problemsOf(operation).join(', ')}.`,
        content: { 'application/problem+json': { schema: { $ref: refTo('Problem') } } },
      },
    },
  };
}

function parametersOf({ path, query, headers = {} }: Operation): Json[] {
  const inPath = path.includes('{id}')
    ? [{ name: 'id', in: 'path', required: true, schema: { type: 'string', format: 'uuid' } }]
    : [];
  const inHeaders = Object.entries(headers).map(([name, { description, required }]) => ({
    name,
    in: 'header',
    required,
    description,
    schema: { type: 'string' },
  }));
  if (query === undefined) return [...inPath, ...inHeaders];
  const { properties = {} } = shapeOf(query, 'output') as { properties?: Record<string, Json> };
  const required = (shapeOf(query, 'input') as { required?: string[] }).required ?? [];
  const inQuery = Object.entries(properties).map(([name, schema]) => ({
    name,
    in: 'query',
    required: required.includes(name),
    schema,
  }));
  return [...inPath, ...inHeaders, ...inQuery];
}

function responseOf({
  description,
  schema,
  mediaType = 'application/json',
  headers = {},
}: Answer): Json {
  return {
    description,
    headers: Object.fromEntries(
      Object.entries(headers).map(([name, text]) => [
        name,
        { description: text, schema: { type: 'string' } },
      ]),
    ),
    ...(schema === undefined
      ? {}
      : { content: { [mediaType]: { schema: shapeOf(schema, 'output') } } }),
  };
}

/** What any call may be refused with, by what it checks, and what this one says of itself. */
function problemsOf({ method, path, access, body, query, problems = [] }: Operation): number[] {
  const usual = [
    ...(method === 'GET' ? [] : [403]),
    ...(access === 'member' ? [401] : []),
    ...(path.includes('{id}') ? [404] : []),
    ...(body === undefined ? [] : [400, 413, 415, 422]),
    ...(query === undefined ? [] : [422]),
    500,
  ];
  return [...new Set([...usual, ...problems])].sort((a, b) => a - b);
}

/** A schema in the document: by reference where it, or what it lists, has a name. */
function shapeOf(schema: z.ZodType, io: 'input' | 'output'): Json {
  const id = named.get(schema)?.id;
  if (id !== undefined) return { $ref: refTo(id) };
  if (schema instanceof z.ZodArray) {
    return { type: 'array', items: shapeOf(schema.element as z.ZodType, io) };
  }
  return withoutMeta(z.toJSONSchema(schema, { io, unrepresentable: 'any' }));
}

function withoutMeta(schema: object): Json {
  const { $schema: _dialect, $id: _id, ...rest } = schema as Json;
  return rest;
}

function refTo(id: string): string {
  return `#/components/schemas/${id}`;
}
