export const loadTableStyles = `
.ht-loads { display: grid; grid-template-columns: minmax(0, 1fr); gap: 0; min-width: 0; }
.ht-load, .ht-loads-head { display: grid; grid-template-columns: minmax(90px, 1.15fr) minmax(98px, 1.1fr) minmax(92px, 1fr) minmax(110px, 1.3fr) minmax(120px, 1.3fr) 30px; gap: 4px 14px; align-items: start; }
.ht-loads-head { font-size: 12px; color: var(--ht-quiet); padding-bottom: 4px; border-bottom: 1px solid var(--ht-rule); }
.ht-loads-head > :nth-child(4) { text-align: end; }
.ht-load { padding: 5px 0; border-bottom: 1px solid var(--ht-hair); }
.ht-load .ht-box { border-color: transparent; padding: 1px 0 2px; gap: 5px; }
.ht-load .ht-box:hover, .ht-load .ht-box:focus-within { border-color: var(--ht-galvanised); }
.ht-load .ht-box:has(input:placeholder-shown) { border-color: var(--ht-rule); }
.ht-load .ht-bad .ht-box { border-color: var(--ht-fail); }
.ht-load .ht-box :is(input, select) { font-size: 14px; }
.ht-load-pair { display: grid; grid-template-columns: 1fr auto 1fr; gap: 6px; align-items: baseline; }
.ht-load-at { display: grid; grid-template-columns: auto 1fr; gap: 8px; align-items: baseline; }
.ht-load-at > span, .ht-load-pair > span, .ht-load-say { color: var(--ht-quiet); font-size: 12px; line-height: 28px; }
.ht-load-value input { text-align: end; }
.ht-load-cap { display: none; }
.ht-load-remove { font: 400 18px/1 var(--ht-sans); color: var(--ht-quiet); background: none; border: 0; width: 30px; height: 30px; cursor: pointer; border-radius: 3px; }
.ht-load-remove:hover { color: var(--ht-fail); }
.ht-load > .ht-fault { grid-column: 1 / -1; margin: 0 0 2px; }
.ht-loads > .ht-acts { padding-top: 8px; }
@container ht-sheet (width < 700px) {
  .ht-loads-head { display: none; }
  .ht-loads { border-top: 1px solid var(--ht-rule); }
  .ht-load { grid-template-columns: 1fr 1fr 30px; grid-template-areas: "name nature remove" "shape value value" "place place place"; gap: 6px 14px; padding: 10px 0 12px; }
  .ht-load > :nth-child(1) { grid-area: name; } .ht-load > :nth-child(2) { grid-area: nature; } .ht-load > :nth-child(3) { grid-area: shape; }
  .ht-load > :nth-child(4) { grid-area: value; } .ht-load > :nth-child(5) { grid-area: place; } .ht-load > :nth-child(6) { grid-area: remove; }
  .ht-load .ht-box { border-color: var(--ht-rule); }
  .ht-load-value input { text-align: start; }
}
`;
