/** Family names of our own: a page's fonts of the same make stay as they are. */
const faces = [
  ['Headtree Sans', '400', 'headtree-sans-400.woff2'],
  ['Headtree Sans', '600', 'headtree-sans-600.woff2'],
  ['Headtree Mono', '400', 'headtree-mono-400.woff2'],
  ['Headtree Mono', '600', 'headtree-mono-600.woff2'],
  ['Headtree Math', '400', 'headtree-math.woff2'],
] as const;

const documents = new WeakSet<Document>();

/**
 * Makes the fonts known to a document, once. A shadow root cannot bring fonts of its own. The
 * browser fetches a face when text in it is first drawn: the one for formulas only with a formula.
 */
export function addFonts(document: Document, folder: string): void {
  if (documents.has(document)) return;
  documents.add(document);
  for (const [family, weight, file] of faces) {
    const source = `url("${folder}${file}") format("woff2")`;
    document.fonts.add(new FontFace(family, source, { weight, display: 'swap' }));
  }
}
