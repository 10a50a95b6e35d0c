export const sectionDrawingStyles = `
.ht-figure .ht-outline { fill: var(--ht-wash); stroke: var(--ht-ink); stroke-width: 1.4; stroke-linejoin: round; }
.ht-figure .ht-ghost { fill: var(--ht-wash); stroke: var(--ht-galvanised); stroke-width: 1; stroke-linejoin: round; }
.ht-figure .ht-centre-line { fill: none; stroke: var(--ht-galvanised); stroke-width: 1; stroke-dasharray: 9 3 2 3; }
.ht-figure .ht-thin { fill: none; stroke: var(--ht-galvanised); stroke-width: 1; }
.ht-figure .ht-size { fill: var(--ht-quiet); }
.ht-figure .ht-from { text-anchor: start; }
.ht-figure .ht-letter { font-weight: 600; }
.ht-figure .ht-lost { fill: var(--ht-sheet); stroke: var(--ht-ink); stroke-width: 1; }
.ht-figure .ht-lost-lines { fill: none; stroke: var(--ht-ink); stroke-width: 1; }
.ht-pair { display: grid; grid-template-columns: repeat(2, minmax(0, 1fr)); gap: 22px 24px; align-items: start; }
.ht-pair:has(.ht-drawing-empty) { grid-template-columns: minmax(0, 1fr); }
.ht-row-section { grid-template-columns: 1.2fr 1.8fr 1fr; }
.ht-row-sizes { grid-template-columns: repeat(4, minmax(0, 1fr)); }
.ht-row-even { grid-template-columns: repeat(4, minmax(0, 1fr)); }
.ht-axial { display: grid; grid-template-columns: subgrid; grid-column: span 2; gap: inherit; align-items: start; }
@container ht-sheet (width < 620px) {
  .ht-pair { grid-template-columns: minmax(0, 1fr); }
  .ht-row-section, .ht-row-even, .ht-row-sizes { grid-template-columns: repeat(2, minmax(0, 1fr)); }
}
`;
