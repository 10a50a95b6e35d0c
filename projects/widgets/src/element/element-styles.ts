import { sheetStyles } from '@headtree/checks';

/**
 * Around the library's own look: the element is a block unless the page says otherwise, and nothing
 * that the page's style sheets set is inherited past the frame. Only its colour scheme is. Of all
 * properties `all` leaves out the direction of writing alone, so that is set.
 */
const frame = `
:host { display: block; }
:host([hidden]) { display: none; }
.frame { all: initial; display: block; color-scheme: inherit; direction: ltr; }
.said { all: initial; display: block; margin-block-end: 8px; padding: 8px 12px; border: 1px solid;
  font: 14px/1.5 "Headtree Sans", system-ui, sans-serif; color: light-dark(#a32a22, #ef8a80);
  background: light-dark(#fdfcf9, #1e2429); color-scheme: inherit; direction: ltr; }
.said:empty { display: none; }
`;

const sheets = new WeakMap<Document, readonly CSSStyleSheet[]>();

/** Puts the look on a shadow root: adopted sheets need no style tag and no nonce. */
export function adoptStyles(root: ShadowRoot): void {
  const { ownerDocument } = root;
  const view = ownerDocument.defaultView;
  if (!view) return;
  let made = sheets.get(ownerDocument);
  if (!made) {
    made = [frame, sheetStyles].map((text) => {
      const sheet = new view.CSSStyleSheet();
      sheet.replaceSync(text);
      return sheet;
    });
    sheets.set(ownerDocument, made);
  }
  root.adoptedStyleSheets = [...made];
}
