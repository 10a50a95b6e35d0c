export const fieldStyles = `
.ht-label { display: block; font-size: 12px; line-height: 1.5; color: var(--ht-quiet); margin-bottom: 2px; }
.ht-box {
  display: flex; align-items: baseline; gap: 8px; border-bottom: 1px solid var(--ht-galvanised); padding: 2px 0 3px; position: relative;
}
.ht-box:focus-within { border-color: var(--ht-timber); box-shadow: 0 1px 0 var(--ht-timber); }
.ht-box :is(input, select) {
  font: 400 15px/1.5 var(--ht-mono); font-variant-numeric: tabular-nums; color: var(--ht-ink); background: none; border: 0; border-radius: 0;
  width: 100%; min-width: 0; padding: 0; margin: 0; height: 24px;
}
.ht-box input::placeholder { color: var(--ht-quiet); opacity: 0.85; }
.ht-box .ht-words { font-family: var(--ht-sans); }
.ht-box select { appearance: none; padding-inline-end: 16px; cursor: pointer; text-overflow: ellipsis; }
.ht-box:has(select)::after {
  content: ""; position: absolute; inset-inline-end: 2px; top: 13px; border: 4px solid transparent; border-top-color: var(--ht-quiet); pointer-events: none; forced-color-adjust: none;
}
.ht-box option { background: var(--ht-sheet); color: var(--ht-ink); }
.ht-sheet .ht-box :is(input, select):focus-visible { outline: none; }
.ht-box:has(:focus-visible) { outline: 2px solid var(--ht-timber); outline-offset: 3px; }
.ht-box :is(input, select):disabled { opacity: 1; -webkit-text-fill-color: currentColor; cursor: default; }
.ht-unit { color: var(--ht-quiet); font: 12px var(--ht-mono); white-space: nowrap; }
.ht-field.ht-bad .ht-box { border-color: var(--ht-fail); box-shadow: 0 1px 0 var(--ht-fail); }
.ht-fault { display: block; color: var(--ht-fail); font-size: 12px; line-height: 1.4; margin-top: 4px; overflow-wrap: anywhere; }
.ht-fault-choices { display: flex; flex-wrap: wrap; gap: 6px; margin-top: 4px; }
.ht-fault-choices button {
  font: 400 12px/1.4 var(--ht-mono); color: var(--ht-fail); background: none; border: 1px solid currentColor; border-radius: 3px; padding: 3px 8px; cursor: pointer; min-height: 26px;
}
.ht-tick { display: flex; gap: 8px; align-items: center; font-size: 14px; min-height: 28px; }
.ht-tick input { accent-color: var(--ht-timber); width: 16px; height: 16px; margin: 0; flex: none; }
.ht-ways { border: 0; margin: 0; padding: 0; min-width: 0; display: flex; flex-wrap: wrap; gap: 0 24px; }
.ht-ways legend { padding: 0; }
.ht-row { display: grid; grid-template-columns: 2fr 1fr 1.7fr 1.1fr; gap: 18px 20px; align-items: start; }
.ht-form { display: grid; grid-template-columns: minmax(0, 1fr); gap: 18px; min-width: 0; }
.ht-more-fields { display: grid; gap: 18px; padding-top: 12px; }
.ht-waiver { display: grid; grid-template-columns: 1.2fr 2fr auto; gap: 6px 20px; align-items: start; }
.ht-waiver + .ht-waiver { margin-top: 8px; }
@container ht-sheet (width < 620px) {
  .ht-row { grid-template-columns: repeat(2, minmax(0, 1fr)); gap: 14px 16px; grid-auto-flow: dense; }
  .ht-row > .ht-wide { grid-column: 1 / -1; }
  .ht-waiver { grid-template-columns: 1fr; }
}
@media (pointer: coarse) { .ht-box :is(input, select) { font-size: 16px; height: 30px; } }
@media print { .ht-box { border-color: var(--ht-rule); } .ht-box:has(select)::after { display: none; } }
`;
