import { STATUS_CODES } from 'node:http';
import type { z } from 'zod';
import { BASE_PATH, type Endpoint } from '#shared/api/endpoint.ts';
import { PROBLEMS } from '#shared/api/problems.ts';
import { PERMISSIONS, ROLES } from '#shared/api/roles.ts';
import { ENDPOINTS } from '#shared/api/table.ts';
import { SchemaCollection } from './schemas.ts';

const CAUTION = 'Dextral is a working aid, not a qualified tool: verify its answers independently; applicable regulations and licensed practice decide.';

/** The OpenAPI 3.1 document of the endpoint table. */
export function openApiDocument(): Record<string, unknown> {
  const schemas = new SchemaCollection();
  const paths: Record<string, Record<string, unknown>> = {};
  for (const endpoint of ENDPOINTS) (paths[endpoint.path] ??= {})[endpoint.method] = operationOf(endpoint, schemas);
  return {
    openapi: '3.1.0',
    info: {
      title: 'Dextral', version: '1',
      summary: 'Keeps attitude data meaning the same thing on both sides of an interface.',
      description: `Every convention is stated facet by facet; nothing has a default. Every answer carries its request id in X-Request-Id and is in the history before it leaves. Errors are problem documents (RFC 9457).\n\n${CAUTION}`,
    },
    servers: [{ url: BASE_PATH }],
    tags: [...new Set(ENDPOINTS.map(({ tag }) => tag))].map((name) => ({ name })),
    paths,
    components: {
      schemas: { ...sorted(schemas.components), Problem: problemSchema },
      securitySchemes: {
        apiKey: { type: 'http', scheme: 'bearer', description: 'An API key, issued in the console.' },
        session: { type: 'apiKey', in: 'cookie', name: 'dextral', description: 'The session of a person signed in to the console.' },
      },
    },
  };
}

function operationOf(endpoint: Endpoint, schemas: SchemaCollection): Record<string, unknown> {
  const parameters = [...parametersOf(endpoint.params, 'path', schemas), ...parametersOf(endpoint.query, 'query', schemas)];
  return {
    operationId: endpoint.id,
    tags: [endpoint.tag],
    summary: endpoint.summary,
    description: [endpoint.description, whoMay(endpoint)].filter(Boolean).join('\n\n'),
    security: endpoint.auth === 'public' || endpoint.auth === 'visitor' ? [] : endpoint.auth === 'session' ? [{ session: [] }] : [{ apiKey: [] }, { session: [] }],
    ...(parameters.length > 0 ? { parameters } : {}),
    ...(endpoint.body ? { requestBody: { required: true, content: { 'application/json': { schema: schemas.of(endpoint.body, 'input'), ...(endpoint.example === undefined ? {} : { example: endpoint.example }) }, ...rowContents(endpoint) } } } : {}),
    responses: responsesOf(endpoint, schemas),
  };
}

/** Rows are bytes to OpenAPI: what they hold is said in the endpoint's description. */
const rowContents = ({ rowTypes = [] }: Endpoint): Record<string, unknown> => Object.fromEntries(rowTypes.map((type) => [type, {}]));

function whoMay({ auth, permission }: Endpoint): string {
  if (auth === 'public' || auth === 'visitor') return '';
  if (!permission) return 'For anybody signed in.';
  const roles = ROLES.filter((role) => PERMISSIONS[permission][role] !== 'none').map((role) => `${role}${PERMISSIONS[permission][role] === 'own' ? ' (their own)' : ''}`);
  return `Roles: ${roles.join(', ')}.`;
}

function parametersOf(schema: z.ZodType | undefined, where: 'path' | 'query', schemas: SchemaCollection): Record<string, unknown>[] {
  if (!schema) return [];
  const { properties = {}, required = [] } = schemas.of(schema, 'input') as { properties?: Record<string, Record<string, unknown>>; required?: string[] };
  return Object.entries(properties).map(([name, { description, ...rest }]) => ({
    name, in: where, required: where === 'path' || required.includes(name), ...(description === undefined ? {} : { description }), schema: rest,
  }));
}

const requestIdHeader = { 'X-Request-Id': { description: 'The id of this call in the history.', schema: { type: 'string', format: 'uuid' } } };

function responsesOf(endpoint: Endpoint, schemas: SchemaCollection): Record<string, unknown> {
  const success = {
    description: STATUS_CODES[endpoint.status],
    headers: requestIdHeader,
    ...(endpoint.response ? { content: { [endpoint.contentType ?? 'application/json']: { schema: schemas.of(endpoint.response, 'output') }, ...rowContents(endpoint) } } : {}),
  };
  const refusals = [...endpoint.problems, 500].map((status) => [String(status), {
    description: `${STATUS_CODES[status]}. Codes: ${codesWith(status)}.`,
    headers: requestIdHeader,
    content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
  }]);
  return { [endpoint.status]: success, ...Object.fromEntries(refusals) };
}

const codesWith = (status: number): string => Object.entries(PROBLEMS).filter(([, problem]) => problem.status === status).map(([code]) => code).join(', ');

const problemSchema = {
  type: 'object',
  description: 'What was wrong (RFC 9457). `code` is stable; branch on it.',
  required: ['type', 'title', 'status', 'detail', 'instance', 'code', 'errors'],
  properties: {
    type: { type: 'string', examples: ['/problems/missing-facet'] },
    title: { type: 'string' },
    status: { type: 'integer' },
    detail: { type: 'string' },
    instance: { type: 'string', description: 'Names the call by its request id.' },
    code: { type: 'string', enum: Object.keys(PROBLEMS) },
    errors: {
      type: 'array', maxItems: 100,
      items: { type: 'object', required: ['pointer', 'message'], additionalProperties: false, properties: { pointer: { type: 'string', description: 'JSON pointer into the body, or ?name for a query parameter.' }, message: { type: 'string' } } },
    },
  },
};

const sorted = <T>(record: Record<string, T>): Record<string, T> => Object.fromEntries(Object.entries(record).sort(([a], [b]) => (a < b ? -1 : 1)));
