import { convertToParamMap } from '@angular/router';
import { addressOf, filtersFrom, isNarrowed, queryOf, unfiltered } from './usage-filters';

const from = (params: Record<string, string>) => filtersFrom(convertToParamMap(params));
const now = new Date('2026-12-01T12:00:00Z');

describe('filters of the log and the address', () => {
  it('reads an address without filters as the last 30 days of everything', () => {
    expect(from({})).toEqual(unfiltered);
    expect(isNarrowed(from({}))).toBe(false);
  });

  it('brings every filter through the address and back', () => {
    const filters = {
      client: 'c1',
      key: '9Kq2vT7bXw3L',
      check: 'waler',
      profile: 'uk-na@2',
      answer: '422',
      range: 'week',
      console: 'shown',
    } as const;
    expect(from(addressOf(filters) as Record<string, string>)).toEqual(filters);
    expect(isNarrowed(filters)).toBe(true);
  });

  it('leaves what stands at its default out of the address', () => {
    expect(Object.values(addressOf(unfiltered)).every((value) => value === null)).toBe(true);
  });

  it('leaves out what an address cannot mean', () => {
    const { answer, range } = from({ answer: 'passed', range: 'constructor' });
    expect({ answer, range }).toEqual({ answer: '', range: 'month' });
  });

  it('asks the service for an answer of a check, or for an HTTP status', () => {
    expect(queryOf(from({ answer: 'fail' }), now)).toMatchObject({ answer: 'fail', status: null });
    expect(queryOf(from({ answer: '429' }), now)).toMatchObject({ answer: null, status: '429' });
  });

  it('asks from the beginning of the time, or without one', () => {
    expect(queryOf(from({ range: 'hour' }), now).from).toBe('2026-12-01T11:00:00.000Z');
    expect(queryOf(from({ range: 'all' }), now).from).toBeNull();
  });
});
