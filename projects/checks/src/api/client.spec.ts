import type { CheckAnswer, WalerRequest } from '../contract';
import { ApiClient, type ApiAccess } from './api-client';
import { CheckRunner } from './check-runner';

const request = { spans: [3] } as unknown as WalerRequest;
const answer = (utilisation: number) => ({ utilisation }) as CheckAnswer;
const access: ApiAccess = {
  server: 'https://checks.example/',
  apiKey: 'htp_x',
  credentials: 'key',
};
const json = (body: unknown, status = 200, headers = {}) =>
  ({
    ok: status < 300,
    status,
    headers: new Headers(headers),
    json: () => Promise.resolve(body),
  }) as Response;
const settle = () => jest.advanceTimersByTimeAsync(0);

describe('the client', () => {
  it('sends the page key and no cookies', async () => {
    const fetcher = jest.fn().mockResolvedValue(json(answer(0.5)));
    await new ApiClient(access, fetcher).check('waler', request);
    expect(fetcher).toHaveBeenCalledWith(
      'https://checks.example/v1/checks/waler?detail=full',
      expect.objectContaining({
        method: 'POST',
        credentials: 'omit',
        body: '{"spans":[3]}',
        headers: expect.objectContaining({ Authorization: 'Bearer htp_x' }) as unknown,
      }),
    );
  });

  it('sends the session and its token to its own origin, and no key', async () => {
    const fetcher = jest.fn().mockResolvedValue(json(answer(0.5)));
    const session = {
      ...access,
      server: '',
      credentials: 'session',
      csrfToken: () => 'T',
    } as const;
    await new ApiClient(session, fetcher).check('waler', request);
    const [url, init] = fetcher.mock.calls[0] as [string, RequestInit];
    expect(url).toBe('/v1/checks/waler?detail=full');
    expect(init.credentials).toBe('same-origin');
    expect(init.headers).toEqual(expect.objectContaining({ 'X-CSRF-Token': 'T' }));
    expect(init.headers).not.toHaveProperty('Authorization');
  });

  it('refuses a secret key before anything is sent', async () => {
    const fetcher = jest.fn();
    const client = new ApiClient({ ...access, apiKey: ' htk_abc' }, fetcher);
    await expect(client.check('waler', request)).rejects.toMatchObject({ kind: 'secret-key' });
    await expect(client.profiles()).rejects.toMatchObject({ kind: 'secret-key' });
    expect(fetcher).not.toHaveBeenCalled();
  });

  it('asks for a formula once in the life of the page', async () => {
    const fetcher = jest.fn().mockResolvedValue(json({ id: 'A-1' }));
    await new ApiClient(access, fetcher).formula('A-1');
    await new ApiClient(access, fetcher).formula('A-1');
    expect(fetcher).toHaveBeenCalledTimes(1);
  });

  it.each([
    [401, 'key-refused'],
    [403, 'not-allowed'],
    [422, 'not-valid'],
    [429, 'too-many'],
    [503, 'away'],
    [500, 'unexpected'],
  ])('names a problem with status %i', async (status, kind) => {
    const items = [{ pointer: '/spans/0', code: 'must-be-positive', message: 'no' }];
    const problem = { code: 'not-valid', detail: 'Here is why.', errors: items, requestId: 'R' };
    const fetcher = jest.fn().mockResolvedValue(json(problem, status, { 'Retry-After': '7' }));
    await expect(new ApiClient(access, fetcher).check('waler', request)).rejects.toMatchObject({
      kind,
      status,
      items,
      requestId: 'R',
      retryAfter: 7,
    });
  });
});

describe('the runner', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  function withAnswers(...answers: (() => Promise<CheckAnswer>)[]) {
    const signals: (AbortSignal | undefined)[] = [];
    let calls = 0;
    const call = jest.fn((_: object, signal?: AbortSignal) => {
      signals.push(signal);
      const give = answers[Math.min(calls, answers.length - 1)];
      calls += 1;
      return give ? give() : Promise.reject(new Error('none'));
    });
    const runner = new CheckRunner(call);
    return { runner, call, signals };
  }

  it('waits until the typing pauses', async () => {
    const { runner, call } = withAnswers(() => Promise.resolve(answer(0.5)));
    void runner.ask(request);
    await jest.advanceTimersByTimeAsync(200);
    const last = runner.ask(request);
    await jest.advanceTimersByTimeAsync(249);
    expect(call).not.toHaveBeenCalled();
    await jest.advanceTimersByTimeAsync(1);
    expect(call).toHaveBeenCalledTimes(1);
    await expect(last).resolves.toEqual(answer(0.5));
    runner.stop();
  });

  it('lets the last request win and aborts the one before', async () => {
    let release: (late: CheckAnswer) => void = () => undefined;
    const slow = new Promise<CheckAnswer>((resolve) => (release = resolve));
    const { runner, signals } = withAnswers(
      () => slow,
      () => Promise.resolve(answer(0.2)),
    );
    const first = runner.ask(request, true);
    await settle();
    const second = runner.ask(request, true);
    await settle();
    release(answer(0.9));
    await settle();
    expect(signals[0]?.aborted).toBe(true);
    await expect(first).resolves.toBeUndefined();
    await expect(second).resolves.toEqual(answer(0.2));
    expect(runner.state().answer).toEqual(answer(0.2));
    runner.stop();
  });

  it('never shows an answer as that of a form that has changed', async () => {
    const { runner } = withAnswers(() => Promise.resolve(answer(0.5)));
    await Promise.all([runner.ask(request, true), settle()]);
    expect(runner.fresh()).toEqual(answer(0.5));
    void runner.ask(request);
    expect(runner.fresh()).toBeNull();
    runner.stop();
  });

  it('asks an absent service again, later each time, until it is back', async () => {
    const away = () =>
      new ApiClient(access, () => Promise.reject(new TypeError())).check('waler', request);
    const { runner, call } = withAnswers(away, away, () => Promise.resolve(answer(0.5)));
    void runner.ask(request, true);
    await settle();
    expect(runner.state().phase).toBe('offline');
    expect(runner.state().error?.message).toContain('does not answer');
    await jest.advanceTimersByTimeAsync(1000);
    expect(call).toHaveBeenCalledTimes(2);
    await jest.advanceTimersByTimeAsync(1999);
    expect(call).toHaveBeenCalledTimes(2);
    await jest.advanceTimersByTimeAsync(1);
    expect(runner.state()).toMatchObject({ phase: 'answered', answer: answer(0.5), error: null });
    runner.stop();
  });

  it('asks at once when the network is back, or when told to', async () => {
    const away = () =>
      new ApiClient(access, () => Promise.reject(new TypeError())).check('waler', request);
    const { runner, call } = withAnswers(away);
    void runner.ask(request, true);
    await settle();
    globalThis.dispatchEvent(new Event('online'));
    await settle();
    expect(call).toHaveBeenCalledTimes(2);
    runner.tryNow();
    await settle();
    expect(call).toHaveBeenCalledTimes(3);
    runner.stop();
  });

  it('does not ask again what was refused', async () => {
    const problem = json({ detail: 'no', errors: [] }, 422);
    const refuse = () =>
      new ApiClient(access, () => Promise.resolve(problem)).check('waler', request);
    const { runner, call } = withAnswers(refuse);
    await Promise.all([runner.ask(request, true), settle()]);
    await jest.advanceTimersByTimeAsync(60_000);
    expect(call).toHaveBeenCalledTimes(1);
    expect(runner.state().phase).toBe('refused');
    runner.stop();
  });
});
