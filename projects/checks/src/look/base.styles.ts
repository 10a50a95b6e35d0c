/** What every part of a sheet is made of: words, numbers, buttons, disclosures, tables. */
export const base = `
:host { display: block; }
:host([hidden]) { display: none; }
.ht-sheet, .ht-sheet *, .ht-sheet *::before, .ht-sheet *::after { box-sizing: border-box; }
.ht-sheet {
  container: ht-sheet / inline-size;
  background: var(--ht-sheet); color: var(--ht-ink); border: 1px solid var(--ht-rule);
  font: 400 14px/1.5 var(--ht-sans); text-align: start; min-width: 0;
}
:where(.ht-sheet) :where(h2, h3, p, ul, ol, dl, dd, figure) { margin: 0; padding: 0; }
:where(.ht-sheet) :where(ul, ol) { list-style: none; }
.ht-mono, .ht-n { font-family: var(--ht-mono); font-variant-numeric: tabular-nums; }
.ht-n { text-align: right; white-space: nowrap; }
.ht-quiet { color: var(--ht-quiet); }
.ht-small { font-size: 13px; }
.ht-hush { position: absolute; width: 1px; height: 1px; overflow: hidden; clip-path: inset(50%); white-space: nowrap; }
.ht-heading { font: 600 12px/1.5 var(--ht-sans); color: var(--ht-quiet); letter-spacing: 0; }
.ht-heading small { font: 400 12px var(--ht-sans); }
.ht-sheet a { color: var(--ht-timber); text-underline-offset: 2px; }
.ht-button {
  font: 600 13px/1.3 var(--ht-sans); color: var(--ht-timber); background: none;
  border: 1px solid currentColor; border-radius: 3px; padding: 7px 12px; cursor: pointer; min-height: 32px;
}
.ht-button:hover { background: color-mix(in srgb, var(--ht-timber) 9%, transparent); }
.ht-button-quiet { border-color: transparent; padding-inline: 6px; margin-inline-start: -6px; }
.ht-link {
  font: inherit; color: inherit; text-align: start; background: none; border: 0; padding: 0; cursor: pointer;
  text-decoration: underline; text-decoration-color: var(--ht-rule); text-underline-offset: 3px;
}
.ht-link:hover { text-decoration-color: var(--ht-timber); }
.ht-link-timber { color: var(--ht-timber); text-decoration-color: currentColor; }
.ht-sheet :is(button, summary, a, input, select, [tabindex]):focus-visible {
  outline: 2px solid var(--ht-timber); outline-offset: 2px;
}
.ht-more > summary {
  font: 600 13px/1.5 var(--ht-sans); color: var(--ht-timber); cursor: pointer; width: fit-content;
  list-style: none; display: flex; align-items: center; gap: 7px; padding: 4px 0;
}
.ht-more > summary::-webkit-details-marker { display: none; }
.ht-more > summary::before {
  content: ""; width: 6px; height: 6px; flex: none; margin: 0 2px;
  border: solid currentColor; border-width: 0 1.6px 1.6px 0; transform: rotate(-45deg); transition: transform 120ms;
}
.ht-more[open] > summary::before { transform: rotate(45deg); }
.ht-scroll { position: relative; overflow-x: auto; max-width: 100%; scrollbar-width: thin; }
.ht-table { border-collapse: collapse; font-size: 13px; width: 100%; }
.ht-table caption { text-align: start; }
.ht-table th {
  text-align: start; font-weight: 400; color: var(--ht-quiet); font-size: 12px; vertical-align: bottom;
  padding: 0 14px 4px 0; border-bottom: 1px solid var(--ht-rule); white-space: nowrap;
}
.ht-table td, .ht-table tbody th { padding: 6px 14px 6px 0; border-bottom: 1px solid var(--ht-hair); vertical-align: baseline; }
.ht-table tbody th { color: var(--ht-ink); font-size: 13px; }
.ht-table th.ht-n, .ht-table td.ht-n { text-align: right; }
.ht-table thead th { font-family: var(--ht-sans); }
.ht-table :is(th, td):last-child { padding-right: 0; }
@media (prefers-reduced-motion: reduce) {
  .ht-sheet *, .ht-sheet *::before, .ht-sheet *::after { transition: none !important; animation: none !important; }
}
`;
