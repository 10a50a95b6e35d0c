import { ElementHarness, wordsOf } from '../../../testing/element-harness';

/** The section picker as the keyboard meets it. */
export class SectionPickerHarness extends ElementHarness {
  get input(): HTMLInputElement {
    return this.field('Section') as HTMLInputElement;
  }

  get options(): string[] {
    return Array.from(this.host.querySelectorAll('[role="option"]'), (one) => wordsOf(one));
  }

  /** The option that the field points at. */
  get active(): string {
    const id = this.input.getAttribute('aria-activedescendant');
    return id ? wordsOf(this.host.querySelector(`#${id}`)) : '';
  }

  key(key: string): void {
    this.input.dispatchEvent(
      new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }),
    );
  }

  leave(): void {
    this.input.dispatchEvent(new Event('blur'));
  }
}
