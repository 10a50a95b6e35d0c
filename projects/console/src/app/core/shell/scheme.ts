import { Injectable, signal } from '@angular/core';

export type Scheme = 'system' | 'light' | 'dark';
const storeName = 'headtree.scheme';

const stored = (): Scheme => {
  try {
    const value = localStorage.getItem(storeName);
    return value === 'light' || value === 'dark' ? value : 'system';
  } catch {
    return 'system';
  }
};

const apply = (scheme: Scheme): void => {
  const { dataset } = document.documentElement;
  if (scheme === 'system') delete dataset.scheme;
  else dataset.scheme = scheme;
};

/** Before the first paint, so that a dark page does not flash white. */
export const applyStoredScheme = (): void => apply(stored());

/** Light, dark, or as the system has it. */
@Injectable({ providedIn: 'root' })
export class ColourScheme {
  private readonly choice = signal(stored());
  readonly chosen = this.choice.asReadonly();

  choose(scheme: Scheme): void {
    this.choice.set(scheme);
    apply(scheme);
    try {
      if (scheme === 'system') localStorage.removeItem(storeName);
      else localStorage.setItem(storeName, scheme);
    } catch {
      // The choice lasts as long as the page.
    }
  }
}
