export const drawingStyles = `
.ht-drawing { display: block; min-width: 0; }
.ht-drawing svg { display: block; overflow: visible; }
.ht-drawing text { font: 12px var(--ht-mono); font-variant-numeric: tabular-nums; fill: var(--ht-ink); paint-order: stroke; stroke: var(--ht-sheet); stroke-width: 4px; stroke-linejoin: round; }
.ht-drawing .ht-dim { fill: var(--ht-quiet); text-anchor: middle; }
.ht-drawing .ht-mid { text-anchor: middle; }
.ht-drawing .ht-load-line { fill: none; stroke: var(--ht-timber); stroke-width: 1; }
.ht-drawing .ht-load-point { stroke-width: 1.8; }
.ht-drawing .ht-load-head { fill: var(--ht-timber); }
.ht-drawing .ht-member { fill: var(--ht-wash); stroke: var(--ht-ink); stroke-width: 1.4; }
.ht-drawing .ht-prop { fill: none; stroke: var(--ht-ink); stroke-width: 1.4; }
.ht-drawing .ht-prop-lifted { stroke: var(--ht-warn); stroke-dasharray: 3 3; }
.ht-drawing .ht-lifts { fill: var(--ht-warn); }
.ht-drawing .ht-dim-line { fill: none; stroke: var(--ht-galvanised); stroke-width: 1; }
.ht-drawing-empty { color: var(--ht-quiet); font-size: 13px; border: 1px dashed var(--ht-rule); padding: 30px 16px; text-align: center; }
`;
