export const sectionPickerStyles = `
.ht-picker { position: relative; display: block; }
.ht-picker-list {
  position: absolute; z-index: 5; inset-inline: -1px; top: calc(100% + 3px); min-width: min(360px, 100cqi - 32px); max-height: 264px; overflow-y: auto;
  background: var(--ht-sheet); border: 1px solid var(--ht-galvanised); font-size: 13px; max-width: calc(100cqi - 32px);
}
.ht-picker-list li { display: flex; gap: 12px; align-items: baseline; padding: 6px 10px; cursor: pointer; min-height: 32px; font-family: var(--ht-mono); white-space: nowrap; }
.ht-picker-list li + li { border-top: 1px solid var(--ht-hair); }
.ht-picker-list li small { margin-inline-start: auto; color: var(--ht-quiet); font: 12px var(--ht-mono); white-space: nowrap; }
.ht-picker-list li[aria-selected="true"] { background: var(--ht-wash); outline: 2px solid var(--ht-timber); outline-offset: -2px; }
.ht-picker-note { position: absolute; z-index: 5; top: calc(100% + 3px); inset-inline: -1px; padding: 6px 10px; font-size: 12px; color: var(--ht-quiet); background: var(--ht-sheet); border: 1px solid var(--ht-rule); }
`;
