import { computed, inject, Injectable, signal } from '@angular/core';
import { Api } from '../api/api';
import type { Permission } from './permission';

export interface Person {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly string[];
}

export interface SessionState {
  readonly person: Person | null;
  readonly permissions: readonly string[];
  readonly csrfToken: string | null;
}

/** Who is signed in, and what they may do. */
@Injectable({ providedIn: 'root' })
export class Session {
  private readonly api = inject(Api);
  private readonly state = signal<SessionState | null>(null);
  private loading: Promise<SessionState> | undefined;

  readonly person = computed(() => this.state()?.person ?? null);
  readonly csrfToken = computed(() => this.state()?.csrfToken ?? null);
  private readonly permissions = computed(() => new Set(this.state()?.permissions));

  /** What the service last said of the session; asked once, until it ends. */
  async ready(): Promise<SessionState> {
    return this.state() ?? (await this.load());
  }

  async load(): Promise<SessionState> {
    this.loading ??= this.api.get<SessionState>('/v1/session').finally(() => {
      this.loading = undefined;
    });
    const state = await this.loading;
    this.state.set(state);
    return state;
  }

  may(permission: Permission): boolean {
    return this.permissions().has(permission);
  }

  async signIn(email: string, password: string): Promise<void> {
    this.state.set(await this.api.post<SessionState>('/v1/session', { email, password }));
  }

  async signOut(): Promise<void> {
    await this.api.delete('/v1/session');
    this.forget();
  }

  /** The session is over; the next look asks again. */
  forget(): void {
    this.state.set(null);
  }
}
