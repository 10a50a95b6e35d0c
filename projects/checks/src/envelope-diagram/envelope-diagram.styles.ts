export const diagramStyles = `
.ht-figure { display: grid; grid-template-columns: minmax(0, 1fr); gap: 4px; min-width: 0; }
.ht-figure svg { display: block; overflow: visible; }
.ht-figure text { font: 12px var(--ht-mono); font-variant-numeric: tabular-nums; fill: var(--ht-ink); text-anchor: middle; paint-order: stroke; stroke: var(--ht-sheet); stroke-width: 3px; stroke-linejoin: round; }
.ht-figure .ht-axis { stroke: var(--ht-ink); stroke-width: 1.2; }
.ht-figure .ht-band { fill: color-mix(in srgb, var(--ht-galvanised) 17%, transparent); stroke: none; }
.ht-figure .ht-curve { fill: none; stroke: var(--ht-galvanised); stroke-width: 1.4; stroke-linejoin: round; }
.ht-figure .ht-support { fill: var(--ht-ink); }
.ht-figure .ht-support-line { stroke: var(--ht-hair); stroke-width: 1; }
@media (forced-colors: active) { .ht-figure .ht-band { fill: none; } }
`;
