import type { ChildProcess } from 'node:child_process';
import type { Browser, Page } from 'playwright-core';
import { hashPassword } from '../../server/features/people/password';
import { htmlOf, startBrowser } from './support/browser';
import { answerOf, field, waler } from './support/element';
import {
  answers,
  end,
  freePort,
  start,
  startService,
  type RunningService,
} from './support/service';
import { startSite, type Site } from './support/site';
import { passing } from './support/waler';

/**
 * The whole job once through: an admin makes a client and a page key in the console, an engineer
 * checks a waler with it on the firm's intranet, the admin sees every call.
 */
const password = 'the tide is out at noon';
const email = 'admin@saltmarsh.example';
let browser: Browser;
let service: RunningService;
let site: Site;
let port: number;
let intranet: ChildProcess | undefined;
let admin: Page;
let key: string;

beforeAll(async () => {
  [browser, service, site, port] = await Promise.all([
    startBrowser(),
    startService(),
    startSite(),
    freePort(),
  ]);
  await service.sql(
    `INSERT INTO users (email, name, password_hash, roles) VALUES ($1, 'Admin', $2, '{admin}')`,
    [email, hashPassword(password, 4)],
  );
  admin = await (await browser.newContext({ viewport: { width: 1440, height: 1000 } })).newPage();
});
afterAll(async () => {
  await browser.close();
  if (intranet) await end(intranet);
  await Promise.allSettled([service.stop(), site.stop()]);
});

const origin = (): string => `http://127.0.0.1:${port}`;
const button = (name: string) => admin.getByRole('button', { name, exact: true });

it('the admin signs in, makes a client and issues it a page key', async () => {
  await admin.goto(service.url);
  await admin.getByLabel('E-mail').fill(email);
  await admin.getByLabel('Password').fill(password);
  await button('Sign in').click();
  await admin
    .getByRole('link', { name: /^Clients/ })
    .first()
    .click();
  await button('Make a client').click();
  await admin.getByLabel('Name').fill('Saltmarsh intranet');
  await button('Make the client').click();
  await admin.getByRole('heading', { name: 'Saltmarsh intranet' }).waitFor();
  await button('Issue a key').click();
  await admin.getByRole('radio', { name: /Page key/ }).check();
  await admin.getByLabel('Label').fill('waler page');
  await admin.getByLabel(/^Origins/).fill(origin());
  await button('Issue the key').click();
  key = (await admin.getByLabel('The key', { exact: true }).textContent())?.trim() ?? '';
  expect(key).toMatch(/^htp_[0-9A-Za-z]{12}_[0-9A-Za-z]{49}$/);
  await button('I have stored the key').click();
});

let engineer: Page;
it('an engineer’s waler fails on the intranet, is changed and passes', async () => {
  const env = {
    ...process.env,
    HEADTREE_URL: service.url,
    HEADTREE_PAGE_KEY: key,
    INTRANET_PORT: String(port),
  };
  intranet = start('examples/intranet/serve.mjs', env);
  await answers(origin(), intranet);
  engineer = await browser.newPage();
  const violations: string[] = [];
  engineer.on('console', (said) => {
    if (/Content Security Policy/i.test(said.text())) violations.push(said.text());
  });
  await engineer.goto(origin());
  await answerOf(engineer);
  const value = waler(engineer).getByLabel('Value', { exact: true }).first();
  await value.fill('400');
  await engineer.locator('headtree-waler:state(fail)').waitFor();
  await engineer.getByText(/^fail, /).waitFor();

  await value.fill('60');
  await engineer.locator('headtree-waler:state(incomplete)').waitFor();
  await waler(engineer).getByText('Overhangs, props, twin members, waivers').click();
  await waler(engineer).getByRole('button', { name: 'Waive a verification' }).click();
  await field(engineer, 'Waived verification').selectOption('transverse-force');
  await field(engineer, 'Reason, printed beside the status').fill('stiffeners at every prop');
  await engineer.locator('headtree-waler:state(pass)').waitFor();
  await engineer.getByText(/^pass, utilisation/).waitFor();
  expect(violations).toEqual([]);
});

it('the cross-section and the stresses stand on a second page of the intranet', async () => {
  const page = await browser.newPage();
  const violations: string[] = [];
  page.on('console', (said) => {
    if (/Content Security Policy/i.test(said.text())) violations.push(said.text());
  });
  await page.goto(`${origin()}/sections`);
  for (const element of ['headtree-section', 'headtree-stress'])
    await page.locator(`${element}:state(pass)`).waitFor();
  const moment = page.locator('headtree-section').getByLabel('My, about y-y', { exact: true });
  await moment.fill('900');
  await page.locator('headtree-section:state(fail)').waitFor();
  await page.getByText(/^fail, .* section: /).waitFor();
  expect(violations).toEqual([]);
  await page.close();
});

it('the same key is refused on a page of another origin', async () => {
  // An origin that another key lists, so that the page may read why.
  await service.addKey('page', [site.origin]);
  const page = await browser.newPage();
  await page.goto(site.put('/', { html: htmlOf(service.url, { key, value: passing }) }));
  await page.getByText('The Origin of the page is not on the list of the key.').first().waitFor();
  expect(await page.locator('headtree-waler:state(pass)').count()).toBe(0);
});

it('the admin sees the calls, opens one, and finds the refused one', async () => {
  await admin.goto(`${service.url}/usage`);
  const rows = admin.getByRole('table').getByRole('row').filter({ hasText: 'Saltmarsh intranet' });
  for (const answer of ['pass', 'fail', 'origin-not-allowed'])
    await rows.filter({ hasText: answer }).first().waitFor();
  const failed = rows.filter({ hasText: 'fail' }).filter({ hasText: 'waler' });
  await failed.first().getByRole('link').last().click();
  await admin.getByRole('heading', { name: 'One call' }).waitFor();
  await admin.getByText('From page (Origin)').waitFor();
  const facts = (await admin.getByRole('main').textContent()) ?? '';
  for (const part of ['Saltmarsh intranet', origin(), 'waler', 'fail'])
    expect(facts).toContain(part);

  const [refused] = await service.sql<{ origin: string; key_selector: string }>(
    `SELECT origin, key_selector FROM usage_events WHERE code = 'origin-not-allowed'
      AND method = 'POST'`,
  );
  expect(refused).toEqual({ origin: site.origin, key_selector: key.split('_')[1] });
});
