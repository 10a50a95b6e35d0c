import { Agent, request } from 'node:http';

/** An answer that arrived whole. */
export interface Acknowledged {
  /** The caller's own X-Request-Id. */
  readonly label: string;
  readonly requestId: string;
  readonly status: number;
}

interface Target {
  readonly port: number;
  readonly key: string;
  readonly label: string;
}

const body = JSON.stringify({
  profile: 'uk-na',
  material: { type: 'steel', grade: 'S275' },
  section: 'UB 457x191x67',
  loadBasis: 'characteristic',
  spans: [3, 3],
  loads: [{ name: 'earth', nature: 'permanent', kind: 'uniform', value: 40 }],
  bearing: { length: 0.2 },
});

/** One call; null when the connection broke before the answer was whole. */
function post(agent: Agent, { port, key, label }: Target): Promise<Acknowledged | null> {
  return new Promise((resolve) => {
    const asked = request(
      {
        agent,
        host: '127.0.0.1',
        port,
        method: 'POST',
        path: '/v1/checks/waler?detail=summary',
        headers: {
          Authorization: `Bearer ${key}`,
          'Content-Type': 'application/json',
          'X-Request-Id': label,
        },
      },
      (answer) => {
        answer.resume();
        answer.on('error', () => resolve(null));
        answer.on('close', () => {
          const requestId = String(answer.headers['x-request-id']);
          resolve(answer.complete ? { label, requestId, status: answer.statusCode ?? 0 } : null);
        });
      },
    );
    asked.on('error', () => resolve(null));
    asked.end(body);
  });
}

/** Many connections that call without a pause until they are told to stop or cannot go on. */
export function startCallers(port: number, key: string, name: string, connections = 32) {
  const agent = new Agent({ keepAlive: true, maxSockets: connections });
  const acknowledged: Acknowledged[] = [];
  let stopped = false;
  const one = async (index: number): Promise<void> => {
    for (let count = 0; !stopped; count++) {
      const answer = await post(agent, { port, key, label: `${name}-${index}-${count}` });
      if (!answer) return;
      acknowledged.push(answer);
    }
  };
  const all = Promise.all(Array.from({ length: connections }, (_, index) => one(index)));
  return {
    acknowledged,
    stop: async (): Promise<void> => {
      stopped = true;
      await all;
      agent.destroy();
    },
  };
}
