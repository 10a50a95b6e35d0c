/** A part of a page as a reader meets it: by labels and words, never by classes of its own. */
export class ElementHarness {
  constructor(readonly host: Element) {}

  /** The text without what is written for the eye alone. */
  get text(): string {
    return wordsOf(this.host);
  }

  /** The field with a label. */
  field(label: string): HTMLInputElement | HTMLSelectElement {
    const found = Array.from(this.host.querySelectorAll('label')).find(
      (one) => tidy(one.textContent).startsWith(label) && one.htmlFor !== '',
    );
    const field = found ? this.host.querySelector(`#${found.htmlFor}`) : null;
    if (!field) throw new Error(`No field is labelled “${label}”.`);
    return field as HTMLInputElement | HTMLSelectElement;
  }

  /** Writes into the field with a label, as typing does. */
  write(label: string, text: string): void {
    write(this.field(label), text);
  }

  /** What is said to be wrong with the field with a label; '' where nothing is. */
  fault(label: string): string {
    const field = this.field(label);
    const id = field.getAttribute('aria-describedby');
    if (field.getAttribute('aria-invalid') !== 'true' || !id) return '';
    return tidy(this.host.querySelector(`#${id}`)?.textContent);
  }

  /** Presses the button with a name. */
  press(name: string): void {
    const button = Array.from(this.host.querySelectorAll('button')).find(
      (one) => (one.getAttribute('aria-label') ?? tidy(one.textContent)) === name,
    );
    if (!button) throw new Error(`No button is named “${name}”.`);
    button.click();
  }

  /** The words that stand for each drawing. */
  get images(): string[] {
    return Array.from(
      this.host.querySelectorAll('[role="img"]'),
      (one) => one.ariaLabel ?? one.getAttribute('aria-label') ?? '',
    );
  }
}

/** Without the spaces that markup leaves. */
export function tidy(text: string | null | undefined): string {
  return (text ?? '').replace(/\s+/g, ' ').trim();
}

/** The words of an element, apart where its parts stand apart. */
export function wordsOf(element: Element | null | undefined): string {
  if (!element) return '';
  const walker = element.ownerDocument.createTreeWalker(element, NodeFilter.SHOW_TEXT);
  const words: string[] = [];
  while (walker.nextNode()) words.push(walker.currentNode.textContent ?? '');
  return tidy(words.join(' ')).replace(/ ([.,;])/g, '$1');
}

/** Writes into a field or chooses in it, as a reader does. */
export function write(field: HTMLInputElement | HTMLSelectElement, text: string): void {
  field.value = text;
  field.dispatchEvent(
    new Event(field instanceof HTMLSelectElement ? 'change' : 'input', { bubbles: true }),
  );
}
