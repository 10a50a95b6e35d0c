import { Ajv2020 } from 'ajv/dist/2020';
import type { OpenAPIV3_1 } from 'openapi-types';
import served from '../../openapi/generated/openapi.served.json';
import { unitScale } from '../../server/engine/units/units';
import { validateAnswer, validateRequest } from '../../server/middleware/validation';
import { contract, type ContractSchema, nameOf } from '../../server/middleware/validation/document';
import { problemKinds } from '../../server/middleware/problem-codes';
import { badInputCases } from './bad-input-matrix';

type Media = Readonly<Record<string, OpenAPIV3_1.MediaTypeObject>>;
interface Operation {
  readonly name: string;
  readonly operation: OpenAPIV3_1.OperationObject;
}

const methods = ['get', 'post', 'delete', 'put', 'patch'] as const;
const { schemas } = contract.components;

const operations: Operation[] = Object.entries(contract.paths ?? {}).flatMap(([path, item]) =>
  methods.flatMap((method) => {
    const operation = item?.[method];
    return operation ? [{ name: `${method.toUpperCase()} ${path}`, operation }] : [];
  }),
);

/** What a local reference points to; anything else as it is. */
function follow<T extends object>(part: T): T {
  if (!('$ref' in part)) return part;
  const path = String(part.$ref).split('/').slice(1);
  return path.reduce<unknown>((node, key) => (node as Record<string, unknown>)[key], contract) as T;
}

/** Names of the schemas that a part of the contract reaches. */
function reached(part: unknown, seen = new Set<string>()): Set<string> {
  if (part === null || typeof part !== 'object') return seen;
  for (const [key, value] of Object.entries(part)) {
    if (key === '$ref' && String(value).startsWith('#/components/schemas/')) {
      const name = nameOf(String(value));
      if (seen.has(name)) continue;
      seen.add(name);
      reached(schemas[name], seen);
    } else if (key === '$ref') reached(follow({ $ref: String(value) }), seen);
    else if (key !== 'example' && key !== 'examples') reached(value, seen);
  }
  return seen;
}

const asked = new Set<string>();
const answered = new Set<string>();
for (const { operation } of operations) {
  reached(operation.requestBody, asked);
  reached(operation.responses, answered);
}

/** Every schema under a name, inline ones too, with the way to it. */
function nodes(schema: ContractSchema, way: string): [string, ContractSchema][] {
  const below = [
    ...Object.entries(schema.properties ?? {}).map(([name, part]) => nodes(part, `${way}.${name}`)),
    ...(schema.items ? [nodes(schema.items, `${way}[]`)] : []),
    ...(schema.oneOf ?? []).map((part, i) => nodes(part, `${way}|${i}`)),
  ];
  return [[way, schema], ...below.flat()];
}

const nodesOf = (names: Iterable<string>): [string, ContractSchema][] =>
  [...names].flatMap((name) => nodes(schemas[name] ?? {}, name));

describe('requests', () => {
  it('have closed objects, but for what is validated on its own', () => {
    const open = nodesOf(asked).filter(
      ([, { type, additionalProperties }]) => type === 'object' && additionalProperties !== false,
    );
    expect(open.map(([way]) => way)).toEqual(['BatchItem.input']);
  });

  it('have unit, sign and limit at every quantity', () => {
    const units = Object.keys(unitScale);
    const bare = nodesOf(asked).filter(([, schema]) => {
      if (schema.$ref !== '#/components/schemas/QuantityInput') return false;
      const rule = schema['x-quantity'];
      return !rule || !units.includes(rule.unit) || !(rule.max > 0) || !schema.description;
    });
    expect(bare.map(([way]) => way)).toEqual([]);
    expect(nodesOf(asked).filter(([, schema]) => schema['x-quantity']).length).toBeGreaterThan(100);
  });

  it('limit every text and every list', () => {
    const endless = nodesOf(asked).filter(([, schema]) => {
      const types = [schema.type].flat();
      if (schema.enum ?? schema.const) return false;
      if (types.includes('string')) return !schema.maxLength || !schema.pattern;
      return types.includes('array') && !schema.maxItems;
    });
    expect(endless.map(([way]) => way)).toEqual([]);
  });

  it('share nothing with answers but closed lists of words', () => {
    const shared = [...asked].filter((name) => answered.has(name));
    expect(shared.filter((name) => !schemas[name]?.enum)).toEqual([]);
  });

  it('describe every field', () => {
    const described = (schema: ContractSchema): boolean =>
      Boolean(
        schema.description ??
        schema.title ??
        schema.const ??
        (schema.$ref && described(schemas[nameOf(schema.$ref)] ?? {})),
      );
    const fields = [...asked].flatMap((name) =>
      Object.entries(schemas[name]?.properties ?? {}).map(
        ([field, schema]) => [`${name}.${field}`, schema] as const,
      ),
    );
    expect(fields.filter(([, schema]) => !described(schema)).map(([way]) => way)).toEqual([]);
  });
});

describe('operations', () => {
  it.each(operations)('$name names its errors as problems', ({ name, operation }) => {
    const { responses = {}, security } = operation;
    const statuses = Object.keys(responses);
    const isPublic = security?.length === 0;
    const wanted = ['422', '500', ...(isPublic ? [] : ['401', '403', '429', '503'])];
    const ofBody = operation.requestBody ? ['400', '413', '415'] : [];
    const ofName = name.includes('{') && name.startsWith('GET') ? ['404'] : [];
    expect(statuses).toEqual(expect.arrayContaining([...wanted, ...ofBody, ...ofName]));
    for (const status of statuses.filter((each) => Number(each) >= 400)) {
      const { content = {}, headers = {} } = follow(
        responses[status] ?? {},
      ) as OpenAPIV3_1.ResponseObject;
      const isProbe = name === 'GET /readyz' && status === '503';
      expect(Object.keys(content)).toEqual([
        isProbe ? 'application/json' : 'application/problem+json',
      ]);
      expect(headers).toHaveProperty('X-Request-Id');
      if (status === '429' || status === '503') expect(headers).toHaveProperty('Retry-After');
      if (status === '401') expect(headers).toHaveProperty('WWW-Authenticate');
    }
  });

  it('show examples that validate, requests and answers', () => {
    let count = 0;
    const faults = operations.flatMap(({ name, operation }) => {
      const { content = {} } = follow(
        operation.requestBody ?? {},
      ) as Partial<OpenAPIV3_1.RequestBodyObject>;
      const bodies = Object.values(operation.responses ?? {}).flatMap((each) => {
        const { content: media = {} } = follow(each) as OpenAPIV3_1.ResponseObject;
        return examplesOf(media);
      });
      const check = (schema: string, body: unknown, validate: typeof validateRequest) => {
        count += 1;
        return validate(schema, body).map((item) => ({ name, body, item }));
      };
      return [
        ...examplesOf(content).flatMap(([schema, body]) => check(schema, body, validateRequest)),
        ...bodies.flatMap(([schema, body]) => check(schema, body, validateAnswer)),
      ];
    });
    expect(faults).toEqual([]);
    expect(count).toBeGreaterThan(100);
  });

  it('with a body show an example of it', () => {
    const without = operations.filter(({ operation }) => {
      const { content } = (operation.requestBody ?? {}) as Partial<OpenAPIV3_1.RequestBodyObject>;
      return content && Object.values(content).some((each) => !each.example && !each.examples);
    });
    expect(without.map(({ name }) => name)).toEqual([]);
  });

  it('use codes that have a page', () => {
    const examples = Object.values(contract.components.responses).map(
      ({ content }) =>
        content?.['application/problem+json']?.example as { code: string } | undefined,
    );
    const codes = examples.flatMap((example) => (example ? [example.code] : []));
    expect(codes.filter((code) => !(code in problemKinds))).toEqual([]);
  });
});

/** Examples of JSON bodies with the name of their schema. */
function examplesOf(content: Media): [schema: string, body: unknown][] {
  return Object.values(content).flatMap(({ schema, example, examples }) => {
    if (!schema || !('$ref' in schema)) return [];
    const name = nameOf(schema.$ref);
    const several = Object.values(examples ?? {}).map(
      (each) => (follow(each) as { value: unknown }).value,
    );
    return [...(example === undefined ? [] : [example as unknown]), ...several].map(
      (body): [string, unknown] => [name, body],
    );
  });
}

describe('what is served', () => {
  it('is the contract without what is marked as not served', () => {
    const marked = operations.filter(({ operation }) => 'x-served' in operation);
    const shown = Object.values(served.paths).flatMap((item) => Object.keys(item));
    expect(shown).toHaveLength(operations.length - marked.length);
    expect(Object.keys(served.paths)).toContain('/v1/checks/waler');
    expect(JSON.stringify(served)).not.toContain('x-served');
  });
});

describe('our own reading of the schemas', () => {
  // Structure only: what a quantity's text and number mean is ours alone to say.
  const ofQuantities = new Set(['not-a-quantity', 'wrong-unit', 'unknown-unit', 'not-finite']);
  const ofLimits = new Set(['negative', 'must-be-positive', 'too-large']);
  const plain = new Ajv2020({ strict: false, validateFormats: false });
  plain.addSchema({ $id: 'plain', components: contract.components });

  it.each(['WalerRequest', 'MemberRequest', 'StressRequest', 'BearingRequest'])(
    'refuses what any validator refuses in a %s',
    (name) => {
      const validate = plain.compile({ $ref: `plain#/components/schemas/${name}` });
      const let_through = badInputCases(name).filter(({ body }) => {
        const codes = validateRequest(name, body).map(({ code }) => code);
        const ours = codes.every((code) => ofQuantities.has(code) || ofLimits.has(code));
        return !ours && validate(body);
      });
      expect(let_through.map(({ name: words }) => words)).toEqual([]);
    },
  );
});
