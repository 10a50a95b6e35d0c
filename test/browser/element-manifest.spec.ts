import { startBench, type Bench } from './support/browser';

/** What is published about the element holds of the element. */
let bench: Bench;
beforeAll(async () => {
  bench = await startBench();
});
afterAll(() => bench.stop());

interface Named {
  readonly name: string;
  readonly kind?: string;
  readonly readonly?: boolean;
}
interface Manifest {
  readonly modules: readonly {
    readonly declarations: readonly {
      readonly tagName: string;
      readonly attributes: readonly Named[];
      readonly members: readonly Named[];
      readonly events: readonly Named[];
    }[];
  }[];
}

/** What a form-associated element has of the browser. */
const ofTheBrowser = ['name'];

const tags = ['headtree-waler', 'headtree-section', 'headtree-stress'] as const;

async function declarations() {
  const response = await fetch(`${bench.service.url}/elements/v1/custom-elements.json`);
  const manifest = (await response.json()) as Manifest;
  return manifest.modules[0]?.declarations ?? [];
}

it('the manifest declares every element and no other', async () => {
  expect((await declarations()).map(({ tagName }) => tagName)).toEqual(tags);
});

it.each(tags)('the manifest names every attribute and every member of %s', async (tag) => {
  const declared = (await declarations()).find(({ tagName }) => tagName === tag);
  if (!declared) throw new Error('The manifest does not declare it.');
  const page = await bench.open({ element: tag });
  const real = await page.evaluate((tag) => {
    const element = customElements.get(tag) as unknown as {
      observedAttributes: string[];
      prototype: object;
    };
    const inherited = Object.getPrototypeOf(element.prototype) as object;
    const names = [element.prototype, inherited].flatMap((one) =>
      Object.entries(Object.getOwnPropertyDescriptors(one)).map(([name, descriptor]) => ({
        name,
        kind: typeof descriptor.value === 'function' ? 'method' : 'field',
        readonly: descriptor.get !== undefined && descriptor.set === undefined,
      })),
    );
    return { attributes: element.observedAttributes, names };
  }, declared.tagName);

  expect(declared.attributes.map(({ name }) => name).sort()).toEqual(
    [...real.attributes, ...ofTheBrowser].sort(),
  );
  const own = real.names.filter(
    ({ name }) => !/Callback$|^constructor$|^ngElement|^subscribeToEvents$/.test(name),
  );
  expect(declared.members.map(({ name }) => name).sort()).toEqual(
    [...new Set(own.map(({ name }) => name))].sort(),
  );
  for (const { name, kind, readonly = false } of declared.members)
    expect(own.find((one) => one.name === name)).toEqual({ name, kind, readonly });
});

// Three checks; Angular with Material makes 111 KiB of two fields, a select and a button.
it('the script stays under 110 KiB as it is sent, and may be loaded and kept by any page', async () => {
  const response = await fetch(`${bench.service.url}/elements/v1/headtree-elements.js`, {
    headers: { 'Accept-Encoding': 'gzip' },
  });
  expect(Number(response.headers.get('content-length'))).toBeLessThan(110 * 1024);
  expect(Object.fromEntries(response.headers)).toMatchObject({
    'access-control-allow-origin': '*',
    'cross-origin-resource-policy': 'cross-origin',
    'content-type': 'text/javascript; charset=utf-8',
    'content-encoding': 'gzip',
  });
  const etag = response.headers.get('etag') ?? '';
  const again = await fetch(response.url, {
    headers: { 'If-None-Match': etag, 'Accept-Encoding': 'gzip' },
  });
  expect(again.status).toBe(304);
});
