export const interactionStyles = `
.ht-figure .ht-to { text-anchor: end; }
.ht-figure .ht-acts-here { fill: var(--ht-timber); stroke: var(--ht-sheet); stroke-width: 1.5; }
`;
