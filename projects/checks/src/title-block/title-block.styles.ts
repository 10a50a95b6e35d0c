export const titleBlockStyles = `
.ht-title { display: grid; grid-template-columns: repeat(6, auto); border-top: 1px solid var(--ht-rule); font-size: 12px; }
.ht-title > div { padding: 9px 14px 10px 24px; border-inline-start: 1px solid var(--ht-rule); min-width: 0; }
.ht-title > div:first-child { border-inline-start: 0; }
.ht-title dt { color: var(--ht-quiet); font-size: 11px; line-height: 1.5; }
.ht-title dd { font: 12.5px/1.5 var(--ht-mono); color: var(--ht-ink); overflow-wrap: anywhere; }
.ht-title dd span { display: block; }
@container ht-sheet (width < 820px) {
  .ht-title { grid-template-columns: repeat(3, 1fr); }
  .ht-title > div { border-inline-start: 0; border-bottom: 1px solid var(--ht-hair); }
}
@container ht-sheet (width < 560px) {
  .ht-title { grid-template-columns: 1fr 1fr; }
  .ht-title > div { padding-inline: 16px 8px; }
}
`;
