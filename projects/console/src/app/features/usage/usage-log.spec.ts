import { provideZonelessChangeDetection } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Api, type Query } from '../../core/api/api';
import { UsageLog } from './usage-log';

interface Row {
  id: string;
  personId: string | null;
  checkId: string | null;
  route: string;
  httpStatus: number;
}

const tools = (name: string, count: number): Row[] =>
  Array.from({ length: count }, (_, index) => ({
    id: `${name}${index}`,
    personId: null,
    checkId: 'waler',
    route: '/v1/checks/waler',
    httpStatus: 200,
  }));
const consoles = (count: number): Row[] =>
  Array.from({ length: count }, (_, index) => ({
    id: `own${index}`,
    personId: 'p1',
    checkId: null,
    route: '/v1/clients',
    httpStatus: 200,
  }));

function logOver(pages: readonly Row[][]) {
  const asked: Query[] = [];
  const get = (_path: string, query: Query) => {
    asked.push(query);
    const index = Number(query.pageToken ?? 0);
    const nextPageToken = index + 1 < pages.length ? String(index + 1) : null;
    return Promise.resolve({ items: pages[index], nextPageToken });
  };
  TestBed.configureTestingModule({
    providers: [provideZonelessChangeDetection(), UsageLog, { provide: Api, useValue: { get } }],
  });
  return { log: TestBed.inject(UsageLog), asked };
}

describe('the loaded part of the log', () => {
  it('goes on to older calls by the token of the page before, newest first', async () => {
    const { log, asked } = logOver([tools('a', 60), tools('b', 60)]);
    await log.read({ check: 'waler' }, false);
    expect(log.hasOlder()).toBe(true);
    await log.readOlder();
    expect(log.calls()?.map(({ id }) => id)).toEqual(
      [...tools('a', 60), ...tools('b', 60)].map(({ id }) => id),
    );
    expect(asked[1]).toMatchObject({ check: 'waler', pageToken: '1' });
    expect(log.hasOlder()).toBe(false);
  });

  it('leaves out what the console asked, says how much, and reads on until enough is shown', async () => {
    const { log, asked } = logOver([[...consoles(190), ...tools('a', 10)], tools('b', 60), []]);
    await log.read({}, false);
    expect(log.calls()).toHaveLength(70);
    expect(log.leftOut()).toBe(190);
    expect(asked).toHaveLength(2);
  });

  it('counts a sign-in as the console’s, unless it was refused', async () => {
    const [row] = consoles(1);
    const signIn = { ...row, id: 'in', personId: null, checkId: null, route: '/v1/session' };
    const { log } = logOver([
      [
        { ...signIn, httpStatus: 200 },
        { ...signIn, id: 'refused', httpStatus: 401 },
      ],
    ]);
    await log.read({}, false);
    expect(log.calls()?.map(({ id }) => id)).toEqual(['refused']);
  });

  it('shows it where that is wanted', async () => {
    const { log } = logOver([[...consoles(2), ...tools('a', 1)]]);
    await log.read({}, true);
    expect(log.calls()).toHaveLength(3);
    expect(log.leftOut()).toBe(0);
  });
});
