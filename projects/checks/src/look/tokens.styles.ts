/**
 * The look's values. In a shadow root they stand on the host, where a page may set its own; in a
 * document on its root. `light-dark()` follows the `color-scheme` of where the sheet stands.
 */
export const tokens = `
:root, :host {
  --ht-paper: light-dark(#f7f5f0, #171c20);
  --ht-sheet: light-dark(#fdfcf9, #1e2429);
  --ht-wash: light-dark(#f3efe7, #242b31);
  --ht-ink: light-dark(#1e2a32, #e6e3dc);
  --ht-quiet: light-dark(#55626c, #9fabb2);
  --ht-rule: light-dark(#d8d3c7, #39424a);
  --ht-hair: light-dark(#e9e5db, #2d353c);
  --ht-timber: light-dark(#95531f, #dd9a63);
  --ht-galvanised: light-dark(#5e717c, #8fa3ae);
  --ht-pass: light-dark(#2e6b4a, #7cc39b);
  --ht-warn: light-dark(#7d5200, #e0b055);
  --ht-fail: light-dark(#a32a22, #ef8a80);
  --ht-sans: "Headtree Sans", system-ui, -apple-system, "Segoe UI", sans-serif;
  --ht-mono: "Headtree Mono", ui-monospace, "SFMono-Regular", Consolas, monospace;
  --ht-math: "Headtree Math", "Cambria Math", "STIX Two Math", math, serif;
}
@media (forced-colors: active) {
  :root, :host {
    --ht-paper: Canvas; --ht-sheet: Canvas; --ht-wash: Canvas;
    --ht-ink: CanvasText; --ht-quiet: CanvasText; --ht-rule: CanvasText; --ht-hair: CanvasText;
    --ht-timber: LinkText; --ht-galvanised: CanvasText;
    --ht-pass: CanvasText; --ht-warn: CanvasText; --ht-fail: CanvasText;
  }
}
@media print {
  :root, :host {
    --ht-paper: #fff; --ht-sheet: #fff; --ht-wash: #fff;
    --ht-ink: #14191d; --ht-quiet: #4b565e; --ht-rule: #a9a69e; --ht-hair: #d5d2ca;
    --ht-timber: #6f3d15; --ht-galvanised: #5e717c;
    --ht-pass: #2e6b4a; --ht-warn: #7d5200; --ht-fail: #a32a22;
  }
}
`;

/** Names of the font families, private to the product; the host application loads them. */
export const fontFamilies = {
  sans: 'Headtree Sans',
  mono: 'Headtree Mono',
  math: 'Headtree Math',
} as const;
