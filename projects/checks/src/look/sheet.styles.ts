/** How the parts stand on the sheet, for its own width and on paper. */
export const sheet = `
.ht-head { display: flex; align-items: baseline; flex-wrap: wrap; gap: 4px 16px; padding: 18px 24px 14px; border-bottom: 1px solid var(--ht-rule); }
.ht-head h2 { font: 600 20px/1.2 var(--ht-sans); letter-spacing: -0.01em; }
.ht-factors { margin-inline-start: auto; min-width: 0; display: flex; align-items: baseline; flex-wrap: wrap; gap: 2px 10px; color: var(--ht-quiet); }
.ht-factors select {
  font: 600 14px var(--ht-mono); color: var(--ht-ink); background: none; border: 0; border-bottom: 1px solid var(--ht-galvanised);
  border-radius: 0; padding: 1px 18px 2px 0; max-width: 100%; min-width: 0; appearance: none; cursor: pointer; text-overflow: ellipsis;
}
.ht-factors select:disabled { opacity: 1; border-color: transparent; cursor: default; }
.ht-factors option { background: var(--ht-sheet); color: var(--ht-ink); }
.ht-factors label { display: inline-flex; align-items: baseline; gap: 8px; position: relative; max-width: 100%; min-width: 0; }
.ht-factors label::after { content: ""; position: absolute; inset-inline-end: 3px; top: 8px; border: 4px solid transparent; border-top-color: var(--ht-quiet); pointer-events: none; forced-color-adjust: none; }
.ht-factors label:has(:disabled)::after { display: none; }
.ht-body { display: grid; grid-template-columns: minmax(0, 1fr) 340px; }
.ht-work { padding: 18px 24px 22px; display: grid; grid-template-columns: minmax(0, 1fr); gap: 22px; align-content: start; min-width: 0; }
.ht-margin { border-inline-start: 1px solid var(--ht-rule); background: var(--ht-wash); padding: 18px 22px 22px; min-width: 0; }
.ht-below { border-top: 1px solid var(--ht-rule); padding: 16px 24px 18px; display: grid; grid-template-columns: minmax(0, 1fr); gap: 12px; }
.ht-say { font-size: 12px; color: var(--ht-quiet); padding: 12px 24px 16px; border-top: 1px solid var(--ht-rule); }
.ht-say p + p { margin-top: 4px; }
.ht-figures { display: grid; grid-template-columns: minmax(0, 1fr); gap: 22px; }
.ht-stale {
  --ht-ink: var(--ht-quiet); --ht-timber: var(--ht-quiet); --ht-pass: var(--ht-quiet); --ht-warn: var(--ht-quiet);
  --ht-fail: var(--ht-quiet); --ht-galvanised: var(--ht-rule); color: var(--ht-quiet);
}
@media (min-height: 860px) { .ht-margin > htc-answer-panel { position: sticky; top: 18px; } }
@container ht-sheet (width < 820px) {
  .ht-body { grid-template-columns: minmax(0, 1fr); }
  .ht-margin { border-inline-start: 0; border-bottom: 1px solid var(--ht-rule); order: -1; }
}
@container ht-sheet (width < 560px) {
  .ht-head, .ht-below, .ht-say, .ht-margin, .ht-work { padding-inline: 16px; }
  .ht-factors { margin-inline-start: 0; flex-basis: 100%; }
}
@media print {
  .ht-sheet { border: 0; font-size: 10.5pt; }
  .ht-button, .ht-no-print, .ht-more > summary::before { display: none !important; }
  .ht-head, .ht-work, .ht-margin, .ht-below, .ht-say { padding-inline: 0; }
  .ht-ver .ht-link { text-decoration: none; }
  .ht-margin > htc-answer-panel { position: static; }
  .ht-more::details-content { content-visibility: visible; block-size: auto; }
  .ht-field, .ht-load, .ht-line, .ht-table tr, .ht-figure, .ht-ver > li { break-inside: avoid; }
  .ht-scroll { overflow: visible; }
}
`;
