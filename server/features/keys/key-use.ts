import type { KeyStore } from './key-store';

const today = (): string => new Date().toISOString().slice(0, 10);

/** Notes by day when a key was last used: one write per key and day, behind the answer. */
export class KeyUse {
  private day = '';
  private noted = new Set<string>();
  private waiting: string[] = [];

  constructor(
    private readonly store: KeyStore,
    private readonly onFailure: (error: unknown) => void,
  ) {}

  note(id: string): void {
    const day = today();
    if (day !== this.day) {
      this.day = day;
      this.noted.clear();
    }
    if (this.noted.has(id)) return;
    this.noted.add(id);
    this.waiting.push(id);
    if (this.waiting.length === 1) setImmediate(() => void this.write());
  }

  private async write(): Promise<void> {
    const ids = this.waiting.splice(0);
    try {
      await this.store.noteUse(ids);
    } catch (error) {
      // The next use of the day tries again.
      for (const id of ids) this.noted.delete(id);
      this.onFailure(error);
    }
  }
}
