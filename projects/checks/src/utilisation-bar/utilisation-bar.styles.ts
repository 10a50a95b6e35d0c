export const barStyles = `
.ht-bar { display: block; position: relative; height: 8px; background: var(--ht-hair); min-width: 0; forced-color-adjust: none; print-color-adjust: exact; }
.ht-bar > span { position: absolute; inset: 0 auto 0 0; background: var(--ht-galvanised); transition: width 160ms ease-out; }
.ht-bar-pass > span { background: var(--ht-pass); }
.ht-bar-fail > span { background: var(--ht-fail); }
.ht-bar::after { content: ""; position: absolute; left: 80%; top: -4px; bottom: -4px; width: 1.5px; background: var(--ht-ink); }
.ht-bar-broken::before { content: ""; position: absolute; z-index: 1; left: calc(91% - 3px); top: -3px; bottom: -3px; width: 5px; background: var(--ht-break, var(--ht-wash)); transform: skewX(-18deg); }
.ht-bar-small { height: 5px; }
@media (forced-colors: active) { .ht-bar { background: Canvas; outline: 1px solid CanvasText; } }
`;
