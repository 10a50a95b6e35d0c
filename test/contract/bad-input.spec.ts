import { validateRequest } from '../../server/middleware/validation';
import {
  allowedCases,
  type BadInputCase,
  badInputCases,
  casesByField,
  validBodies,
} from './bad-input-matrix';
import { fieldsOf, requestNames } from './sample';

/** Of the waler every place, of other checks every field, of what goes beyond only its own. */
function casesFor(schemaName: string): readonly BadInputCase[] {
  if (schemaName === 'WalerRequest') return badInputCases(schemaName);
  const cases = casesByField(schemaName);
  const beyond = /(Select|Compare|Limits)Request$/.test(schemaName);
  return beyond ? cases.filter(({ field }) => field.startsWith(`${schemaName}.`)) : cases;
}

describe.each(requestNames())('a bad %s', (schemaName) => {
  const bad = casesFor(schemaName);
  const allowed = allowedCases(schemaName);

  it('is told from a valid one, every field of which is filled', () => {
    for (const body of validBodies(schemaName)) {
      expect(validateRequest(schemaName, body)).toEqual([]);
    }
  });

  it('is refused at the field at fault, with the code and nothing else', () => {
    const wrong = bad.flatMap((each) => {
      const items = validateRequest(schemaName, each.body);
      const astray = items.filter(({ pointer }) => !pointer.startsWith(each.pointer));
      const found = items.find(({ pointer }) => pointer === each.pointer);
      const codeIsRight = (each.expectedCode ?? found?.code) === found?.code;
      return found && codeIsRight && astray.length === 0
        ? []
        : [{ name: each.name, wanted: each.expectedCode, items }];
    });
    expect(wrong).toEqual([]);
  });

  it('is not a zero or a negative that the contract allows', () => {
    const wrong = allowed
      .map(({ name, body }) => ({ name, items: validateRequest(schemaName, body) }))
      .filter(({ items }) => items.length > 0);
    expect(wrong).toEqual([]);
  });

  it('has a case for every field', () => {
    const covered = new Set(badInputCases(schemaName).map(({ field }) => field));
    expect([...fieldsOf(schemaName)].filter((field) => !covered.has(field))).toEqual([]);
  });

  it('has every word of a message readable', () => {
    const messages = bad.flatMap(({ body }) =>
      validateRequest(schemaName, body).flatMap(({ message, fix = message }) => [message, fix]),
    );
    const odd = messages.filter(
      (each) =>
        !/^[^\p{Cc}\p{Cs}\u202e]{5,}[.?]$/u.test(each) || /undefined|\[object|NaN/.test(each),
    );
    expect([...new Set(odd)]).toEqual([]);
  });
});

it('counts its cases', () => {
  const counts = requestNames().map((name) => [
    name,
    fieldsOf(name).size,
    casesByField(name).length,
    allowedCases(name).length,
  ]);
  const lines = counts.map(([name, ...n]) => `${String(name)}: ${n.join(' fields, bad ')}`);
  const sum = requestNames().reduce((total, name) => total + badInputCases(name).length, 0);
  process.stdout.write(`bad-input matrix: ${sum} cases\n${lines.join(' allowed\n')} allowed\n`);
  expect(badInputCases('WalerRequest').length).toBeGreaterThan(500);
});
