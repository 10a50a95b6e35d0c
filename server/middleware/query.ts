import type { Request } from 'express';
import type { RefusalItem } from '../engine/refusal';
import { Problem } from './problem';
import { pointerPart } from './text';
import type { Query, Route } from './route';

/** No parameter is ever ignored: a misspelt one would be taken for done. */
export function readQuery(request: Request, allowed: Route['query'] = {}): Query {
  const errors: RefusalItem[] = [];
  const query: Record<string, string> = {};
  for (const [name, value] of Object.entries(request.query)) {
    const pointer = `/query/${pointerPart(name)}`;
    const rule = Object.hasOwn(allowed, name) ? allowed[name] : undefined;
    if (rule === undefined) {
      const known = Object.keys(allowed).join(', ') || 'none';
      const fix = `Known here: ${known}.`;
      errors.push({ pointer, code: 'unknown-parameter', message: 'No such parameter.', fix });
    } else if (typeof value !== 'string') {
      errors.push({ pointer, code: 'repeated-parameter', message: 'Stands more than once.' });
    } else if (rule !== 'text' && !rule.includes(value)) {
      errors.push({ pointer, code: 'value', message: `Must be ${rule.join(' or ')}.` });
    } else {
      query[name] = value;
    }
  }
  if (errors.length > 0)
    throw new Problem('query-not-valid', 'The query is not valid.', { errors });
  return query;
}
