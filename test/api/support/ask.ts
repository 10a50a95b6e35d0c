import type { Server } from 'node:http';
import request from 'supertest';
import type { ProblemBody } from '../../../server/middleware/problem';

export interface Asking {
  readonly method?: 'get' | 'post' | 'patch' | 'delete' | 'options';
  readonly path: string;
  /** Text of a key, sent as it should be. */
  readonly key?: string | undefined;
  readonly headers?: Readonly<Record<string, string>>;
  /** Text is sent as it is. */
  readonly body?: object | string;
}

export interface Answered {
  readonly status: number;
  /** By lower-case name. */
  readonly headers: Readonly<Record<string, string | undefined>>;
  readonly body: Partial<ProblemBody> & Readonly<Record<string, unknown>>;
  readonly text: string;
}

/** Asks the service once. */
export async function ask(server: Server, asking: Asking): Promise<Answered> {
  const { method = 'get', path, key, headers = {}, body } = asking;
  const asked = request(server)[method](path);
  if (key !== undefined) asked.set('Authorization', `Bearer ${key}`);
  if (typeof body === 'string') asked.set('Content-Type', 'application/json');
  asked.set(headers);
  return await (body === undefined ? asked : asked.send(body));
}
