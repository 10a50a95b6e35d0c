import { Gatherer, GatherFull } from './gather';

const turn = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));

/** A flush that ends when the test says. */
function held(): {
  batches: number[][];
  flush: (rows: readonly number[]) => Promise<number[]>;
  release: () => void;
} {
  const batches: number[][] = [];
  const ends: (() => void)[] = [];
  return {
    batches,
    flush: (rows) => {
      batches.push([...rows]);
      return new Promise((resolve) => ends.push(() => resolve(rows.map((row) => row * 10))));
    },
    release: () => ends.shift()?.(),
  };
}

describe('gathering', () => {
  it('writes rows of one turn together and gives each its own result', async () => {
    const batches: number[][] = [];
    const gatherer = new Gatherer<number, number>({
      flush: (rows) => {
        batches.push([...rows]);
        return Promise.resolve(rows.map((row) => row * 10));
      },
    });
    expect(await Promise.all([1, 2, 3].map((row) => gatherer.add(row)))).toEqual([10, 20, 30]);
    expect(batches).toEqual([[1, 2, 3]]);
  });

  it('flies two at most; the rest ride with the next', async () => {
    const { batches, flush, release } = held();
    const gatherer = new Gatherer<number, number>({ flush });
    const results = [gatherer.add(1)];
    await turn();
    results.push(gatherer.add(2));
    await turn();
    results.push(gatherer.add(3), gatherer.add(4));
    await turn();
    expect(batches).toEqual([[1], [2]]);
    release();
    await turn();
    await turn();
    expect(batches).toEqual([[1], [2], [3, 4]]);
    release();
    release();
    expect(await Promise.all(results)).toEqual([10, 20, 30, 40]);
    await gatherer.idle();
  });

  it('fails a poisoned row alone', async () => {
    const written: number[] = [];
    const gatherer = new Gatherer<number, number>({
      flush: (rows) => {
        if (rows.includes(13)) return Promise.reject(new Error('poison'));
        written.push(...rows);
        return Promise.resolve([...rows]);
      },
      isPoison: () => true,
    });
    const rows = Array.from({ length: 20 }, (_, index) => index);
    const ends = await Promise.allSettled(rows.map((row) => gatherer.add(row)));
    expect(ends.map(({ status }) => status === 'rejected')).toEqual(rows.map((row) => row === 13));
    expect(written).toEqual(rows.filter((row) => row !== 13));
  });

  it('fails all of a batch when the way to the database is cut, without asking again', async () => {
    let flushes = 0;
    const gatherer = new Gatherer<number, number>({
      flush: () => {
        flushes++;
        return Promise.reject(new Error('away'));
      },
    });
    const ends = await Promise.allSettled([1, 2, 3].map((row) => gatherer.add(row)));
    expect(ends.every(({ status }) => status === 'rejected')).toBe(true);
    expect(flushes).toBe(1);
  });

  it('refuses past its length', async () => {
    const { flush, release } = held();
    const gatherer = new Gatherer<number, number>({ flush, maxWaiting: 2 });
    const kept = [gatherer.add(1), gatherer.add(2)];
    await expect(gatherer.add(3)).rejects.toBeInstanceOf(GatherFull);
    await turn();
    release();
    expect(await Promise.all(kept)).toEqual([10, 20]);
  });

  it('refuses past its age, those who come and those who waited', async () => {
    let now = 0;
    const { flush, release } = held();
    const gatherer = new Gatherer<number, number>({ flush, maxAge: 100, clock: () => now });
    const flying = [gatherer.add(1)];
    await turn();
    flying.push(gatherer.add(2));
    await turn();
    const waited = gatherer.add(3);
    now = 101;
    await expect(gatherer.add(4)).rejects.toBeInstanceOf(GatherFull);
    release();
    await expect(waited).rejects.toBeInstanceOf(GatherFull);
    release();
    expect(await Promise.all(flying)).toEqual([10, 20]);
  });
});
