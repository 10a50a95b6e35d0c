export const stateTableStyles = `
.ht-state, .ht-state-head { grid-template-columns: 44px repeat(3, minmax(0, 1fr)) 30px; }
.ht-loads .ht-state-head > :nth-child(4) { text-align: start; }
.ht-state-head sub { font-size: 0.8em; vertical-align: baseline; position: relative; top: 0.25em; }
.ht-state-head small { display: none; font: 11px var(--ht-mono); }
.ht-state-number { line-height: 28px; color: var(--ht-quiet); }
@container ht-sheet (width < 700px) {
  .ht-loads .ht-state-head { display: grid; }
  .ht-state, .ht-state-head { grid-template-columns: 24px repeat(3, minmax(0, 1fr)) 30px; gap: 4px 10px; }
  .ht-loads .ht-state { grid-template-areas: none; }
  .ht-loads .ht-state > :nth-child(n) { grid-area: auto; }
  .ht-loads .ht-state > .ht-fault { grid-column: 1 / -1; }
  .ht-state .ht-unit { display: none; }
  .ht-state-head small { display: block; }
  .ht-state-head > :first-child { visibility: hidden; }
}
`;
