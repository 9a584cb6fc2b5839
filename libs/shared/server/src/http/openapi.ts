import * as z from 'zod';
import { PROBLEM_MEDIA_TYPE, problem, type AnyEndpoint } from '@seamwright/shared/contracts';

type JsonObject = Record<string, unknown>;

const jsonSchema = (schema: z.ZodType, io: 'input' | 'output'): JsonObject => {
  const { $schema: _dropped, ...rest } = z.toJSONSchema(schema, { io, target: 'draft-2020-12' }) as JsonObject;
  return rest;
};

const parametersOf = (schema: z.ZodObject, where: 'path' | 'query'): JsonObject[] =>
  Object.entries(schema.shape).map(([name, field]) => ({
    name,
    in: where,
    required: where === 'path' || !(field as z.ZodType).safeParse(undefined).success,
    schema: jsonSchema(field as z.ZodType, 'input'),
  }));

const header = (name: string, description: string): JsonObject => ({
  name,
  in: 'header',
  required: true,
  description,
  schema: { type: 'string' },
});

function requestBody(endpoint: AnyEndpoint): JsonObject {
  if (endpoint.upload) {
    const fields = endpoint.body ? (jsonSchema(endpoint.body, 'input')['properties'] as JsonObject) : {};
    const schema = {
      type: 'object',
      required: ['file'],
      properties: { ...fields, file: { type: 'string', format: 'binary' } },
    };
    return { requestBody: { required: true, content: { 'multipart/form-data': { schema } } } };
  }
  if (!endpoint.body) return {};
  return {
    requestBody: { required: true, content: { 'application/json': { schema: jsonSchema(endpoint.body, 'input') } } },
  };
}

function answerOf(endpoint: AnyEndpoint): JsonObject {
  if (endpoint.file)
    return { description: 'The file', content: { [endpoint.file]: { schema: { type: 'string', format: 'binary' } } } };
  if (!endpoint.response) return { description: 'Done, nothing to say' };
  return { description: 'Done', content: { 'application/json': { schema: jsonSchema(endpoint.response, 'output') } } };
}

function operation(endpoint: AnyEndpoint): JsonObject {
  const { access } = endpoint;
  return {
    operationId: endpoint.id,
    summary: endpoint.summary,
    tags: [endpoint.id.split('.')[0]],
    description: access.who === 'anyone' ? 'Anyone may call this.' : `For: ${access.roles.join(', ')}.`,
    security: access.who === 'anyone' ? [] : [{ bearer: [] }],
    parameters: [
      ...parametersOf(endpoint.params, 'path'),
      ...parametersOf(endpoint.query, 'query'),
      ...(endpoint.idempotent ? [header('Idempotency-Key', 'The same for every try of one deed')] : []),
      ...(endpoint.guarded ? [header('If-Match', 'The row version that was read, in quotes')] : []),
    ],
    ...requestBody(endpoint),
    responses: {
      [endpoint.status]: answerOf(endpoint),
      default: {
        description: 'A problem document (RFC 9457)',
        content: { [PROBLEM_MEDIA_TYPE]: { schema: { $ref: '#/components/schemas/Problem' } } },
      },
    },
  };
}

/** The OpenAPI 3.1 document of all endpoints, made from their declarations. */
export function openApiDocument(endpoints: readonly AnyEndpoint[], version: string): JsonObject {
  const paths: Record<string, JsonObject> = {};
  for (const endpoint of endpoints) {
    const path = `/api/v1${endpoint.path.replace(/:(\w+)/g, '{$1}')}`;
    (paths[path] ??= {})[endpoint.method.toLowerCase()] = operation(endpoint);
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Seamwright', version, description: 'The trade desk of a meat processor.' },
    paths,
    components: {
      schemas: { Problem: jsonSchema(problem, 'output') },
      securitySchemes: { bearer: { type: 'http', scheme: 'bearer', bearerFormat: 'JWT' } },
    },
  };
}
