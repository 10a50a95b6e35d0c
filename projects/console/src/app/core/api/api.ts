import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import { firstValueFrom, type Observable } from 'rxjs';
import { problemOf } from './problem';

/** Query parameters; those without a value are left out. */
export type Query = Readonly<Record<string, string | number | null | undefined>>;

export const segment = (text: string): string => encodeURIComponent(text);

/** The service's API, by promise; what fails is thrown as a `Problem`. */
@Injectable({ providedIn: 'root' })
export class Api {
  private readonly http = inject(HttpClient);

  get<T>(path: string, query: Query = {}): Promise<T> {
    const params: Record<string, string> = {};
    for (const [name, value] of Object.entries(query))
      if (value !== null && value !== undefined && value !== '') params[name] = String(value);
    return settle(this.http.get<T>(path, { params }));
  }

  post<T>(path: string, body: unknown = {}): Promise<T> {
    return settle(this.http.post<T>(path, body));
  }

  patch<T>(path: string, body: unknown): Promise<T> {
    return settle(this.http.patch<T>(path, body));
  }

  delete(path: string): Promise<unknown> {
    return settle(this.http.delete(path));
  }
}

const settle = <T>(answer: Observable<T>): Promise<T> =>
  firstValueFrom(answer).catch((error: unknown) => {
    throw problemOf(error);
  });
