import { InjectionToken } from '@angular/core';
import type {
  CatalogueShape,
  CheckAnswer,
  CheckId,
  Formula,
  ProfileSummary,
  SectionLine,
} from '../contract';
import { ApiError, awayError, errorOf, secretKeyError } from './api-error';

/** How a page shows who it is: a page key in a header, or the console's own signed-in session. */
export type Credentials = 'key' | 'session';

/** Where the service is and what is shown to it. */
export interface ApiAccess {
  /** Base address of the service; '' for the page's own origin. */
  readonly server: string;
  /** A page key (`htp_…`). */
  readonly apiKey: string;
  readonly credentials: Credentials;
  /** The session's token against forged requests; asked anew for each call. */
  readonly csrfToken?: () => string | null;
}

/** The `fetch` that calls go through; a host may put its own in its place. */
export type Fetcher = (url: string, init: RequestInit) => Promise<Response>;

/** Replaces `fetch` for every check of an injector. */
export const HEADTREE_FETCH = new InjectionToken<Fetcher>('HEADTREE_FETCH', {
  providedIn: 'root',
  factory: () => (url, init) => globalThis.fetch(url, init),
});

/** Gives the token that a signed-in page sends in `X-CSRF-Token`. */
export const HEADTREE_CSRF_TOKEN = new InjectionToken<() => string | null>('HEADTREE_CSRF_TOKEN', {
  providedIn: 'root',
  factory: () => () => null,
});

interface Page<T> {
  readonly items: readonly T[];
  readonly nextPageToken: string | null;
}

/** Formulas never change, so one answer serves every check of the page for ever. */
const formulas = new Map<string, Promise<Formula>>();

/** The calls that a check makes, typed; a call that gives no answer throws an {@link ApiError}. */
export class ApiClient {
  constructor(
    private readonly access: ApiAccess,
    private readonly fetcher: Fetcher = (url, init) => globalThis.fetch(url, init),
  ) {}

  /** Why no call can be made as things stand; undefined where one can. */
  get obstacle(): ApiError | undefined {
    const { credentials, apiKey } = this.access;
    if (isSecretKey(apiKey)) return secretKeyError();
    if (credentials === 'key' && apiKey.trim() === '') {
      return new ApiError({ kind: 'key-refused', code: 'key-required', message: 'No key is set.' });
    }
    return undefined;
  }

  /** Makes a check and asks for the whole working. */
  check(id: CheckId, request: object, signal?: AbortSignal): Promise<CheckAnswer> {
    return this.call(`/v1/checks/${id}?detail=full`, signal, request);
  }

  /** The formula behind a line of the working; asked for once in the life of the page. */
  formula(id: string): Promise<Formula> {
    const name = `${this.access.server} ${id}`;
    const known = formulas.get(name);
    if (known) return known;
    const asked = this.call<Formula>(`/v1/formulas/${encodeURIComponent(id)}`);
    formulas.set(name, asked);
    asked.catch(() => formulas.delete(name));
    return asked;
  }

  /** Sections of the catalogue whose designation fits a text in any spelling, of one shape or all. */
  async sections(
    search: string,
    shape?: CatalogueShape,
    signal?: AbortSignal,
  ): Promise<readonly SectionLine[]> {
    const narrowed = shape === undefined ? {} : { shape };
    const query = new URLSearchParams({ search, ...narrowed, pageSize: '20' }).toString();
    const { items } = await this.call<Page<SectionLine>>(`/v1/sections?${query}`, signal);
    return items;
  }

  /** The factor profiles that may be used. */
  async profiles(signal?: AbortSignal): Promise<readonly ProfileSummary[]> {
    const { items } = await this.call<Page<ProfileSummary>>('/v1/profiles', signal);
    return items;
  }

  private async call<T>(path: string, signal?: AbortSignal, body?: object): Promise<T> {
    const obstacle = this.obstacle;
    if (obstacle) throw obstacle;
    const response = await this.send(path, {
      method: body ? 'POST' : 'GET',
      headers: this.headers(body !== undefined),
      credentials: this.access.credentials === 'session' ? 'same-origin' : 'omit',
      ...(body && { body: JSON.stringify(body) }),
      ...(signal && { signal }),
    });
    if (!response.ok) throw await errorOf(response);
    return (await response.json()) as T;
  }

  private async send(path: string, init: RequestInit): Promise<Response> {
    try {
      return await this.fetcher(`${this.access.server.replace(/\/+$/, '')}${path}`, init);
    } catch (error) {
      if (init.signal?.aborted) throw error;
      throw awayError();
    }
  }

  private headers(withBody: boolean): Record<string, string> {
    const headers: Record<string, string> = { Accept: 'application/json' };
    if (withBody) headers['Content-Type'] = 'application/json';
    if (this.access.credentials === 'key') {
      headers.Authorization = `Bearer ${this.access.apiKey.trim()}`;
    } else if (withBody) {
      const token = this.access.csrfToken?.();
      if (token) headers['X-CSRF-Token'] = token;
    }
    return headers;
  }
}

/** Whether a key is a secret one, which no page may hold. */
export function isSecretKey(key: string): boolean {
  return /^\s*htk_/i.test(key);
}
