/** The whole look as one style sheet, for `adoptedStyleSheets` of a shadow root or a document. */
export const sheetStyles = '';

const adopted = new WeakMap<Document | ShadowRoot, CSSStyleSheet>();

/** Adopts the look in a shadow root or a document, once. */
export function adoptSheetStyles(root: Document | ShadowRoot): void {
  if (adopted.has(root)) return;
  const sheet = new CSSStyleSheet();
  sheet.replaceSync(sheetStyles);
  root.adoptedStyleSheets = [...root.adoptedStyleSheets, sheet];
  adopted.set(root, sheet);
}
