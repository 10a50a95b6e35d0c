import { FloodGate } from './flood';
import type { UsageRow } from './usage-row';

const at = (second: number): Date => new Date(Date.UTC(2026, 0, 31, 8, 0, second));

const row = (second: number, more: Partial<UsageRow> = {}): UsageRow => ({
  id: '01KGAAAAAAAAAAAAAAAAAAAAAA',
  at: at(second),
  phase: 'whole',
  client_id: null,
  key_id: null,
  key_selector: 'selector0000',
  person_id: null,
  method: 'GET',
  route: '/v1/checks',
  check_id: null,
  profile: null,
  profile_revision: null,
  http_status: 401,
  code: 'key-unknown',
  answer: null,
  utilisation: null,
  governing: null,
  items: null,
  duration_us: 1,
  address: '192.0.2.1',
  origin: null,
  caller_request_id: 'label',
  repeats: 1,
  ...more,
});

function gateOf(): { gate: FloodGate; written: UsageRow[] } {
  const written: UsageRow[] = [];
  const gate = new FloodGate((each) => {
    written.push(each);
    return Promise.resolve();
  });
  return { gate, written };
}

describe('a flood of refusals', () => {
  it('has ten rows of its own and one for the rest of the minute', async () => {
    const { gate, written } = gateOf();
    const taken = Array.from({ length: 250 }, (_, index) => gate.takes(row(index % 60)));
    expect(taken.filter((each) => !each)).toHaveLength(10);
    expect(written).toEqual([]);
    expect(gate.takes(row(60))).toBe(false);
    await Promise.resolve();
    expect(written).toMatchObject([
      { repeats: 240, http_status: 401, address: '192.0.2.1', key_selector: null, route: 'many' },
    ]);
    expect(written[0]?.caller_request_id).toBeNull();
    expect(written[0]?.id).not.toBe(row(0).id);
  });

  it('is told apart by address, status and code', async () => {
    const { gate, written } = gateOf();
    for (let index = 0; index < 12; index++) {
      gate.takes(row(index));
      gate.takes(row(index, { address: '192.0.2.2' }));
      gate.takes(row(index, { http_status: 429, code: 'rate-limited' }));
    }
    gate.takes(row(20, { code: 'key-required' }));
    await gate.flush();
    const lines = written.map(
      ({ address, code, repeats }) => `${String(address)} ${String(code)} ${repeats}`,
    );
    expect(lines.sort()).toEqual([
      '192.0.2.1 key-required 1',
      '192.0.2.1 key-unknown 2',
      '192.0.2.1 rate-limited 2',
      '192.0.2.2 key-unknown 2',
    ]);
  });
});
