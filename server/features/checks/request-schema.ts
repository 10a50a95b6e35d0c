import { contract } from '../../middleware/validation/document';

const prefix = '#/components/schemas/';

/** A request's schema on its own: JSON Schema 2020-12, with all that it refers to. */
export function requestSchema(name: string): unknown {
  const { schemas } = contract.components;
  const needed = new Set<string>();
  const collect = (value: unknown): void => {
    if (Array.isArray(value)) value.forEach(collect);
    else if (typeof value === 'object' && value !== null)
      for (const [key, inner] of Object.entries(value)) {
        if (key !== '$ref' || typeof inner !== 'string') collect(inner);
        else visit(inner.slice(prefix.length));
      }
  };
  const visit = (each: string): void => {
    if (needed.has(each)) return;
    needed.add(each);
    collect(schemas[each]);
  };
  visit(name);
  const defs = Object.fromEntries([...needed].sort().map((each) => [each, schemas[each]]));
  const text = JSON.stringify({
    $schema: 'https://json-schema.org/draft/2020-12/schema',
    $ref: `${prefix}${name}`,
    $defs: defs,
  });
  return JSON.parse(text.replaceAll(`"$ref":"${prefix}`, '"$ref":"#/$defs/'));
}
