import { createHash } from 'node:crypto';
import { html, type Answer } from '../middleware/route';

const css = `
:root { color-scheme: light dark;
  --paper: light-dark(#f7f5f0, #171c20); --ink: light-dark(#1e2a32, #e6e3dc);
  --quiet: light-dark(#5b6872, #9aa6ad); --rule: light-dark(#d8d3c7, #39424a);
  --timber: light-dark(#95531f, #dd9a63) }
* { box-sizing: border-box }
body { margin: 0; background: var(--paper); color: var(--ink);
  font: 400 16px/1.55 "Public Sans", system-ui, sans-serif }
main { max-width: 42rem; margin: 0 auto; padding: 2.5rem 1.25rem 4rem }
h1 { font-size: 1.5rem; line-height: 1.2; margin: 0 0 .25rem }
h2 { font-size: 1rem; margin: 2rem 0 .25rem; padding-top: .75rem; border-top: 1px solid var(--rule) }
p, ul, dl { margin: .5rem 0 }
dt { color: var(--quiet); font-size: .875rem } dd { margin: 0 0 .5rem }
code { font-family: "JetBrains Mono", ui-monospace, monospace; font-size: .9375em }
a { color: var(--timber) } a:focus-visible { outline: 2px solid; outline-offset: 2px }
.quiet { color: var(--quiet) }
`;

const hash = createHash('sha256').update(css).digest('base64');
const policy = `default-src 'none'; style-src 'sha256-${hash}'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'`;

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
};

/** Text as it may stand in a page. */
export const escaped = (text: string): string =>
  text.replace(/[&<>"]/g, (character) => entities[character] ?? '');

/** A short plain page; `main` is markup that is safe as it stands. */
export const page = (title: string, main: string): Answer =>
  html(
    `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escaped(title)} · Headtree</title>
<style>${css}</style>
</head>
<body>
<main>
${main}
</main>
</body>
</html>
`,
    policy,
  );
