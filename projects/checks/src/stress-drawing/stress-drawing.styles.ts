export const stressDrawingStyles = `
.ht-figure .ht-tension { fill: color-mix(in srgb, var(--ht-galvanised) 42%, transparent); stroke: var(--ht-galvanised); stroke-width: 1.2; stroke-linejoin: round; }
.ht-figure .ht-compression { fill: none; stroke: var(--ht-galvanised); stroke-width: 1.2; stroke-linejoin: round; }
.ht-figure .ht-governs { fill: none; stroke: var(--ht-timber); stroke-width: 1.8; }
.ht-figure .ht-from { text-anchor: start; }
`;
