export const workingStyles = `
.ht-working { display: grid; grid-template-columns: minmax(0, 1fr); gap: 2px; }
.ht-working-head { display: flex; justify-content: space-between; align-items: baseline; padding-bottom: 6px; }
.ht-group { border-top: 1px solid var(--ht-hair); scroll-margin-top: 12px; }
.ht-group:first-of-type { border-top: 0; }
.ht-group > summary { padding: 7px 0; color: var(--ht-ink); width: auto; }
.ht-group > summary .ht-quiet { font-weight: 400; }
.ht-group > summary .ht-n { margin-inline-start: auto; font: 13px var(--ht-mono); }
.ht-lines { padding: 0 0 14px 17px; }
.ht-line { display: grid; grid-template-columns: minmax(0, 1fr) 220px; gap: 0 24px; align-items: baseline; padding: 7px 0; border-bottom: 1px solid var(--ht-hair); }
.ht-line:last-child { border-bottom: 0; }
.ht-line-title { grid-column: 1; font-size: 12px; color: var(--ht-quiet); }
.ht-line-math { grid-column: 1; padding: 4px 0; overflow-y: hidden; }
.ht-line-pieces { display: flex; flex-wrap: wrap; align-items: center; gap: 4px 6px; width: 100%; }
.ht-line-words { grid-column: 1; font-size: 13px; overflow-wrap: anywhere; }
.ht-line-words.ht-mono { font-size: 12px; color: var(--ht-quiet); }
.ht-line-clause { grid-column: 2; grid-row: 1 / span 2; align-self: center; text-align: end; color: var(--ht-quiet); font: 12px/1.5 var(--ht-mono); }
.ht-math { display: block; flex: none; }
.ht-math math { font-family: var(--ht-math); font-size: 17px; }
.ht-math mn, .ht-math mtext { font-variant-numeric: lining-nums tabular-nums; }
@container ht-sheet (width < 820px) {
  .ht-line-clause { grid-row: 1; }
  .ht-line-math, .ht-line-words { grid-column: 1 / -1; }
}
@container ht-sheet (width < 620px) {
  .ht-line { grid-template-columns: minmax(0, 1fr); }
  .ht-line-clause { grid-column: 1; grid-row: auto; text-align: start; }
  .ht-lines { padding-inline-start: 0; }
}
@media print {
  .ht-math math { font-size: 14px; }
  .ht-math-long math { font-size: 9.5px; }
  .ht-math-longest math { font-size: 6.5px; }
}
`;
