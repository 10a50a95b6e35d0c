/**
 * `npm run bench`: requests a second of one process, each answer after its committed row, against a
 * bare Express echo of the same body in the same run. The figures of a busy machine are worth
 * little; the ratios hold.
 */
import { spawn } from 'node:child_process';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import autocannon from 'autocannon';
import pg from 'pg';
import { build, output } from '../../scripts/lib/build.mjs';
import { makeEnding } from '../../scripts/lib/ending.mjs';
import { root } from '../../scripts/lib/home.mjs';
import { prepare, serviceEnvironment } from '../../scripts/lib/prepare.mjs';
import { startDatabase } from '../../scripts/lib/private-database.mjs';
import { makeTestHome } from '../../scripts/lib/test-home.mjs';

const seconds = Number(process.env.HEADTREE_BENCH_SECONDS ?? 5);
const rounds = 3;
const connections = 32;

const waler = {
  profile: 'uk-na',
  material: { type: 'steel', grade: 'S275' },
  section: 'UB 457x191x67',
  loadBasis: 'characteristic',
  spans: [3.0, 3.0, 2.4],
  overhangs: { start: 0.5 },
  loads: [
    { name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 },
    { name: 'surcharge', nature: 'variable', category: 'surcharge', kind: 'uniform', value: 22 },
  ],
  restraint: 'at-supports',
  bearing: { length: 0.2 },
};
const refused = { ...waler, spans: [] };

/** @param {string} script @param {NodeJS.ProcessEnv} env */
async function start(script, env) {
  const child = spawn(process.execPath, [script], { env, stdio: ['ignore', 'pipe', 'inherit'] });
  ending.add(() => void child.kill('SIGKILL'));
  for await (const line of createInterface({ input: child.stdout })) {
    const { msg, port } = JSON.parse(line);
    if (msg !== 'listening') continue;
    child.stdout.resume();
    return { url: `http://127.0.0.1:${port}`, pid: child.pid ?? 0 };
  }
  throw new Error(`${script} ended before it listened.`);
}

/**
 * Processor time of a process so far, in ms: it tells the cost of a request on a busy machine too.
 *
 * @param {number} pid
 */
function processorTime(pid) {
  const file = `/proc/${pid}/stat`;
  if (!existsSync(file)) return NaN;
  // After the name in brackets come state and numbers; the 12th and 13th are in 1/100 s.
  const fields = readFileSync(file, 'utf8').split(') ')[1]?.split(' ') ?? [];
  return (Number(fields[11]) + Number(fields[12])) * 10;
}

/** @param {number[]} values */
const median = (values) => [...values].sort((a, b) => a - b)[values.length >> 1] ?? NaN;

/** @typedef {{ name: string, pid: number, url: string, body: object, status: number, key?: string }} Course */

/** @param {Course} course */
async function measure({ pid, url, body, status, key }) {
  const before = processorTime(pid);
  const result = await autocannon({
    url,
    method: 'POST',
    connections,
    duration: seconds,
    headers: {
      'Content-Type': 'application/json',
      ...(key && { Authorization: `Bearer ${key}` }),
    },
    body: JSON.stringify(body),
  });
  const wanted = result.statusCodeStats?.[String(status)]?.count ?? 0;
  if (wanted === 0) throw new Error(`${url} answered ${JSON.stringify(result.statusCodeStats)}`);
  const cost = (processorTime(pid) - before) / result.requests.total;
  const others = result.requests.total - wanted + result.errors;
  return { rate: wanted / result.duration, p99: result.latency.p99, cost, others };
}

const ending = makeEnding();
try {
  const home = await makeTestHome();
  ending.add(() => rmSync(home, { recursive: true, force: true }));
  await build();
  const { urls } = await startDatabase({ home, database: 'bench', ending, throwAway: true });
  const { demoKey } = await prepare(urls, {});
  const owner = new pg.Client({ connectionString: urls.owner });
  // Ended below; at a failure the cluster is stopped under it.
  owner.on('error', () => undefined);
  await owner.connect();
  await owner.query('UPDATE api_keys SET rate_limit = 2000000000');

  const env = serviceEnvironment(urls, {
    HEADTREE_DATABASE_OWNER_URL: undefined,
    HEADTREE_PORT: '0',
    HEADTREE_LOG: 'info',
  });
  const service = await start(join(output, 'main.js'), env);
  const echo = await start(join(root, 'test/bench/echo.mjs'), process.env);
  const key = demoKey ?? '';
  const path = `${service.url}/v1/checks/waler`;
  const { pid } = service;
  /** @type {Course[]} */
  const courses = [
    { name: 'Express echo', pid: echo.pid, url: `${echo.url}/echo`, body: waler, status: 200 },
    { name: 'refused (422)', pid, url: `${path}?detail=summary`, body: refused, status: 422, key },
    { name: 'waler, summary', pid, url: `${path}?detail=summary`, body: waler, status: 200, key },
    { name: 'waler, full', pid, url: path, body: waler, status: 200, key },
  ];

  for (const course of courses) await measure(course);
  /** @type {Map<string, { rate: number, p99: number, cost: number, others: number }[]>} */
  const results = new Map(courses.map(({ name }) => [name, []]));
  for (let round = 0; round < rounds; round++)
    for (const course of courses) results.get(course.name)?.push(await measure(course));

  const rateOf = (/** @type {string} */ name) =>
    median((results.get(name) ?? []).map(({ rate }) => rate));
  const yardstick = rateOf('Express echo');
  console.log('');
  console.log(`${connections} connections, ${rounds} rounds of ${seconds} s, medians`);
  for (const [name, measured] of results) {
    const rate = rateOf(name);
    const p99 = median(measured.map((each) => each.p99));
    const cost = median(measured.map((each) => each.cost));
    const columns = [
      name.padEnd(16),
      `${rate.toFixed(0)}/s`.padStart(9),
      (rate / yardstick).toFixed(2).padStart(6),
      `p99 ${p99} ms`.padStart(12),
      `${cost.toFixed(2)} ms of processor each`,
    ];
    const others = measured.reduce((sum, each) => sum + each.others, 0);
    if (others > 0) columns.push(`${others} answered otherwise`);
    console.log(columns.join('  '));
  }
  const { rows } = await owner.query('SELECT count(*)::int AS rows FROM usage_events');
  console.log(`${rows[0].rows} rows in the log`);
  await owner.end();
} finally {
  await ending.end();
}
