import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './home.mjs';
import { Stop } from './say.mjs';

/** Where the fonts come from and the names they are served by. */
const FONTS = {
  'headtree-sans-400': 'public-sans/files/public-sans-latin-400-normal.woff2',
  'headtree-sans-600': 'public-sans/files/public-sans-latin-600-normal.woff2',
  'headtree-mono-400': 'jetbrains-mono/files/jetbrains-mono-latin-400-normal.woff2',
  'headtree-mono-600': 'jetbrains-mono/files/jetbrains-mono-latin-600-normal.woff2',
};
const MATH_FONT = 'stix-two-math/files/stix-two-math-latin-400-normal.woff2';
const MATH_LIMIT = 60 * 1024;
const fontsource = (/** @type {string} */ path) => join(root, 'node_modules/@fontsource', path);

/** Copies the fonts and makes the small one for formulas. @param {string} folder */
export async function makeFonts(folder) {
  mkdirSync(folder, { recursive: true });
  for (const [name, source] of Object.entries(FONTS)) {
    writeFileSync(join(folder, `${name}.woff2`), readFileSync(fontsource(source)));
  }
  // @ts-expect-error -- the package brings no types
  const { default: subset } = await import('subset-font');
  // The MATH table stays, with the larger brackets and roots that it names.
  const font = await subset(readFileSync(fontsource(MATH_FONT)), mathText(), {
    targetFormat: 'woff2',
    noHinting: true,
    keepFeatures: ['ssty'],
  });
  if (font.length > MATH_LIMIT)
    throw new Stop(`The math font has ${font.length} bytes, over ${MATH_LIMIT}.`);
  writeFileSync(join(folder, 'headtree-math.woff2'), font);
}

/** What formulas are written with: Latin, Greek, both in italics too, digits, operators. */
function mathText() {
  const range = (/** @type {number} */ from, /** @type {number} */ to) =>
    Array.from({ length: to - from + 1 }, (_, i) => String.fromCodePoint(from + i)).join('');
  const italics = `${range(0x1d434, 0x1d467)}\u210e${range(0x1d6e2, 0x1d71b)}`;
  const signs = '√≤≥·−×÷±≠≈∞∑∫¯̄‾²³⁴⁶°′ →∈∂Δ‖ϕϵ\u2061\u2062\u2063';
  return `${range(0x20, 0x7e)}${range(0x391, 0x3a9)}${range(0x3b1, 0x3c9)}${italics}${signs}`;
}

/** The fonts' licences ask to go with them. */
export function fontLicences() {
  return ['public-sans', 'jetbrains-mono', 'stix-two-math'].map(
    (name) => `Font ${name}\n\n${readFileSync(fontsource(join(name, 'LICENSE')), 'utf8')}`,
  );
}
