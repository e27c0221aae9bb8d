import { airflowAnswer, airflowRequest } from '@chargewright/contract/airflow';
import { capacityAnswer, capacityRequest } from '@chargewright/contract/capacity';
import { evaluationAnswer, evaluationRequest } from '@chargewright/contract/evaluation';
import { problem } from '@chargewright/contract/problem';
import { psychrometricsAnswer, psychrometricsParameters } from '@chargewright/contract/psychrometrics';
import {
  refrigerantsAnswer,
  saturationByPressure,
  saturationByTemperature,
  saturationParameters,
} from '@chargewright/contract/refrigerant';
import { sourcesAnswer } from '@chargewright/contract/sources';
import { passwordChange, sessionList, signedIn, signInRequest } from '@chargewright/contract/sign-in';
import { weighInAnswer, weighInRequest } from '@chargewright/contract/weigh-in';
import * as z from 'zod';
import { SESSION_COOKIE } from '../sign-in/sessions';

type JsonObject = Readonly<Record<string, unknown>>;

const SCHEMAS = '#/components/schemas/';

/** JSON Schema of a contract schema; schemas with an id are referred to. What a client may send: unknown keys are allowed. */
const jsonSchema = (schema: z.ZodType): JsonObject => {
  const { $schema: _dialect, $defs: _named, ...own } = z.toJSONSchema(schema, { io: 'input', reused: 'inline' });
  return own;
};

const reference = (schema: z.ZodType): JsonObject => ({ $ref: SCHEMAS + (schema.meta()?.id ?? '') });
const json = (schema: JsonObject, type = 'application/json'): JsonObject => ({ content: { [type]: { schema } } });
const answer = (description: string, schema: JsonObject): JsonObject => ({ 200: { description, ...json(schema) } });

const PROBLEMS = {
  400: 'The body is not JSON, or the address cannot be read.',
  401: 'Not signed in, or not with this address and password.',
  403: 'The request came from a page of another server.',
  404: 'There is no such thing.',
  413: 'The body is over 100 kB.',
  415: 'The body is not declared as JSON.',
  422: 'What cannot be; every fault at once.',
  429: 'Too many requests from one address within a second, or failed attempts: Retry-After says how long to wait.',
  503: 'Busy or not ready: try again.',
} as const;

const problems = (...statuses: readonly (keyof typeof PROBLEMS)[]): JsonObject =>
  Object.fromEntries(
    statuses.map((status) => [
      status,
      { description: PROBLEMS[status], ...json(reference(problem), 'application/problem+json') },
    ]),
  );

/** Parameters of a query from its schema. */
function queryParameters(schema: z.ZodObject): readonly JsonObject[] {
  const { properties = {}, required = [] } = jsonSchema(schema) as {
    readonly properties?: Readonly<Record<string, { readonly description?: string }>>;
    readonly required?: readonly string[];
  };
  return Object.entries(properties).map(([name, { description, ...parameterSchema }]) => ({
    name,
    in: 'query',
    required: required.includes(name),
    ...(description === undefined ? {} : { description }),
    schema: parameterSchema,
  }));
}

const service = (status: string): JsonObject => ({
  type: 'object',
  properties: { service: { const: 'chargewright' }, status: { const: status } },
  required: ['service', 'status'],
});

const refrigerantId = {
  name: 'id',
  in: 'path',
  required: true,
  description: 'ASHRAE 34 designation, such as R-410A; case counts.',
  schema: { type: 'string' },
};

/** An operation that computes from a body and stores nothing. */
const computation = (
  operationId: string,
  summary: string,
  body: { readonly request: z.ZodType; readonly answer: z.ZodType },
): JsonObject => ({
  post: {
    operationId,
    summary: `${summary} Stores nothing.`,
    requestBody: { required: true, ...json(reference(body.request)) },
    responses: {
      ...answer('How it came out.', reference(body.answer)),
      ...problems(400, 413, 415, 422, 429, 503),
    },
  },
});

const SIGNED_IN: JsonObject = { security: [{ session: [] }] };
const nothing = (description: string): JsonObject => ({ 204: { description } });

const PATHS: Readonly<Record<string, JsonObject>> = {
  '/api/v1/evaluations': computation('evaluateCheck', 'Judges one check of airflow and charge.', {
    request: evaluationRequest,
    answer: evaluationAnswer,
  }),
  '/api/v1/airflow': computation('findAirflow', 'The airflow: measured, by temperature rise or by the fan table.', {
    request: airflowRequest,
    answer: airflowAnswer,
  }),
  '/api/v1/capacity': computation('findCapacity', 'Cooling delivered, from the air side.', {
    request: capacityRequest,
    answer: capacityAnswer,
  }),
  '/api/v1/weigh-in': computation('judgeWeighIn', 'Required against weighed-in charge, with the whole sum.', {
    request: weighInRequest,
    answer: weighInAnswer,
  }),
  '/api/v1/refrigerants': {
    get: {
      operationId: 'listRefrigerants',
      summary: 'Every refrigerant there are curves for.',
      responses: { ...answer('All of them.', reference(refrigerantsAnswer)), ...problems(429) },
    },
  },
  '/api/v1/refrigerants/{id}/saturation': {
    get: {
      operationId: 'lookUpSaturation',
      summary: 'Bubble and dew temperature at a pressure, or bubble and dew pressure at a temperature.',
      parameters: [refrigerantId, ...queryParameters(saturationParameters)],
      responses: {
        ...answer('At a pressure: °F for psi units, else °C. At a temperature: psi for °F, else kPa.', {
          oneOf: [reference(saturationByPressure), reference(saturationByTemperature)],
        }),
        ...problems(400, 404, 422, 429),
      },
    },
  },
  '/api/v1/psychrometrics': {
    get: {
      operationId: 'lookUpMoistAir',
      summary:
        'Moist air from two of dry bulb, wet bulb, relative humidity, dew point, humidity ratio and enthalpy. Dew point with humidity ratio and wet bulb with enthalpy do not determine it.',
      parameters: queryParameters(psychrometricsParameters),
      responses: {
        ...answer('Every property; inch-pound units for °F, else SI.', reference(psychrometricsAnswer)),
        ...problems(422, 429),
      },
    },
  },
  '/api/v1/sources': {
    get: {
      operationId: 'listSources',
      summary: 'Every figure, table and formula with its source, edition, standing and where it is used.',
      responses: { ...answer('All of them, figures in SI units.', reference(sourcesAnswer)), ...problems(429) },
    },
  },
  '/api/v1/openapi.json': {
    get: {
      operationId: 'describeApi',
      summary: 'This description.',
      responses: { ...answer('OpenAPI 3.1.', { type: 'object' }), ...problems(429) },
    },
  },
  '/api/v1/session': {
    post: {
      operationId: 'signIn',
      summary: 'Signs in; the answer sets the session’s cookie.',
      requestBody: { required: true, ...json(reference(signInRequest)) },
      responses: { ...answer('Signed in.', reference(signedIn)), ...problems(400, 401, 403, 413, 415, 422, 429) },
    },
    get: {
      operationId: 'readSession',
      summary: 'Who is signed in.',
      ...SIGNED_IN,
      responses: { ...answer('The person and her shops.', reference(signedIn)), ...problems(401, 429) },
    },
    delete: {
      operationId: 'signOut',
      summary: 'Ends this session.',
      ...SIGNED_IN,
      responses: { ...nothing('Signed out.'), ...problems(401, 403, 429) },
    },
  },
  '/api/v1/sessions': {
    get: {
      operationId: 'listSessions',
      summary: 'Where the person is signed in.',
      ...SIGNED_IN,
      responses: { ...answer('All sessions.', reference(sessionList)), ...problems(401, 429) },
    },
    delete: {
      operationId: 'signOutEverywhere',
      summary: 'Ends all sessions of the person.',
      ...SIGNED_IN,
      responses: { ...nothing('Signed out everywhere.'), ...problems(401, 403, 429) },
    },
  },
  '/api/v1/sessions/{id}': {
    delete: {
      operationId: 'endSession',
      summary: 'Ends one of the person’s sessions.',
      ...SIGNED_IN,
      parameters: [{ name: 'id', in: 'path', required: true, schema: { type: 'string' } }],
      responses: { ...nothing('Ended.'), ...problems(401, 403, 404, 429) },
    },
  },
  '/api/v1/password': {
    put: {
      operationId: 'changePassword',
      summary: 'Changes the person’s password; her other sessions end.',
      ...SIGNED_IN,
      requestBody: { required: true, ...json(reference(passwordChange)) },
      responses: { ...nothing('Changed.'), ...problems(400, 401, 403, 413, 415, 422, 429) },
    },
  },
  '/healthz': {
    get: {
      operationId: 'isAlive',
      summary: 'Whether the process answers.',
      responses: answer('It does.', service('ok')),
    },
  },
  '/readyz': {
    get: {
      operationId: 'isReady',
      summary: 'Whether the server can read its data.',
      responses: { ...answer('It can.', service('ready')), ...problems(503) },
    },
  },
};

/** Every schema that has an id, by its id. */
function namedSchemas(): JsonObject {
  const { schemas } = z.toJSONSchema(z.globalRegistry, { io: 'input', uri: (id) => SCHEMAS + id });
  return Object.fromEntries(
    Object.entries(schemas)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([id, { $schema: _dialect, $id: _uri, ...schema }]) => [id, schema]),
  );
}

/**
 * The description of the API (OpenAPI 3.1), made from the schemas that requests are parsed by. zod writes the JSON Schema dialect of
 * OpenAPI 3.1 itself, and knows its own exact optionals.
 */
export const openApiDocument = (): JsonObject => ({
  openapi: '3.1.0',
  info: {
    title: 'Chargewright',
    version: '1',
    description:
      'Verifies airflow and refrigerant charge. What computes is open to any origin, without credentials; records are for members of a shop. Fields may be added to answers, never renamed.',
  },
  servers: [{ url: '/' }],
  paths: PATHS,
  components: {
    schemas: namedSchemas(),
    securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: SESSION_COOKIE } },
  },
});
