import type { Call } from './call';
import { figuresOf, within } from './usage-figures';

const call = (change: Partial<Call>): Call => ({
  id: '01JD8Q0000000000000000004F',
  at: '2026-12-01T12:00:00.000Z',
  phase: 'whole',
  clientId: 'c1',
  keyId: null,
  keySelector: null,
  method: 'POST',
  route: '/v1/checks/waler',
  checkId: 'waler',
  profile: null,
  profileRevision: null,
  httpStatus: 200,
  code: null,
  answer: 'pass',
  utilisation: 0.5,
  governing: null,
  items: null,
  durationUs: 1000,
  address: null,
  origin: null,
  callerRequestId: null,
  repeats: 1,
  ...change,
});

describe('figures of the loaded calls', () => {
  it('are nothing where there is no call', () => {
    const { calls, within99, commonest, series } = figuresOf([]);
    expect({ calls, within99, commonest }).toEqual({ calls: 0, within99: null, commonest: null });
    expect(series.calls).toEqual([]);
  });

  it('count a row as often as it stands for a call', () => {
    const refusal = { httpStatus: 401, code: 'key-unknown', clientId: null, repeats: 3 };
    const { calls, refused, clients } = figuresOf([call({}), call(refusal)]);
    expect({ calls, refused, clients }).toEqual({ calls: 4, refused: 3, clients: 1 });
  });

  it('name the commonest refusal with the client it comes from', () => {
    const of = (code: string, clientId: string) => call({ httpStatus: 422, code, clientId });
    const { commonest } = figuresOf([of('a', 'c1'), of('a', 'c2'), of('b', 'c2'), of('b', 'c2')]);
    expect(commonest).toMatchObject({ code: 'b', clientId: 'c2', calls: 2 });
  });

  it('take 99 of 100 by rank, not by mean', () => {
    const times = Array.from({ length: 100 }, (_, index) => call({ durationUs: index + 1 }));
    expect(within(times)).toBe(99);
  });

  it('show a stretch without calls as a gap in the shares, and as none in the count', () => {
    const at = (time: string) => call({ at: `2026-12-01T${time}:00.000Z` });
    const { series } = figuresOf([at('12:03'), at('12:00')]);
    expect(series.step).toBe('one minute');
    expect(series.calls).toEqual([1, 0, 0, 1]);
    expect(series.refused).toEqual([0, null, null, 0]);
  });
});
