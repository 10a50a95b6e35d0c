import { isValid } from 'ulid';

/** Opaque to callers: where the next page begins. */
export const pageToken = (id: string): string => Buffer.from(`1:${id}`).toString('base64url');

/** The id that a token stands for; undefined when it is none of ours. */
export function readPageToken(token: string): string | undefined {
  const [version, id = ''] = Buffer.from(token, 'base64url').toString('latin1').split(':');
  return version === '1' && isValid(id) && pageToken(id) === token ? id : undefined;
}
