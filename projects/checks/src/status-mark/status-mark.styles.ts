export const statusMarkStyles = `
.ht-mark { display: inline-flex; flex: none; }
.ht-mark svg { display: block; width: 26px; height: 26px; }
.ht-mark-pass { color: var(--ht-pass); }
.ht-mark-fail { color: var(--ht-fail); }
.ht-mark-incomplete, .ht-mark-provisional, .ht-mark-away { color: var(--ht-warn); }
.ht-mark-none, .ht-mark-busy, .ht-mark-refused { color: var(--ht-quiet); }
.ht-mark-busy svg { animation: ht-turn 1.6s linear infinite; }
@keyframes ht-turn { to { transform: rotate(1turn); } }
@media print { .ht-mark { print-color-adjust: exact; } }
`;
