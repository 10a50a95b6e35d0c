import { computed, inject, Injectable, signal } from '@angular/core';
import { Api } from '../api/api';
import type { Page } from '../api/page';
import { Session } from '../session/session';

interface Named {
  readonly id: string;
  readonly name: string;
}

interface ProfileChoice {
  readonly slug: string;
  readonly revisions: readonly { readonly revision: number }[];
}

interface CheckChoice {
  readonly id: string;
  readonly title: string;
}

/** Names to choose from: clients, profiles and checks, as far as the person may know them. */
@Injectable({ providedIn: 'root' })
export class Choices {
  private readonly api = inject(Api);
  private readonly session = inject(Session);

  readonly clients = signal<readonly Named[]>([]);
  readonly profiles = signal<readonly ProfileChoice[]>([]);
  readonly checks = signal<readonly CheckChoice[]>([]);
  private readonly clientNames = computed(
    () => new Map(this.clients().map(({ id, name }) => [id, name])),
  );

  /** What cannot be read stays as it was: a choice less is no reason to refuse the page. */
  read(): void {
    if (this.session.may('clients:read'))
      this.fill('/v1/clients', (items) => this.clients.set(items));
    if (this.session.may('profiles:read'))
      this.fill('/v1/profiles', (items) => this.profiles.set(items));
    this.fill('/v1/checks', (items) => this.checks.set(items));
  }

  clientName(id: string | null): string {
    if (id === null) return '–';
    return this.clientNames().get(id) ?? `${id.slice(0, 8)}…`;
  }

  private fill(path: string, take: (items: readonly never[]) => void): void {
    this.api.get<Page<never>>(path).then(
      ({ items }) => take(items),
      () => undefined,
    );
  }
}
