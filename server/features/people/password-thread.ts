import { matchesPassword } from './password';

export interface PasswordTask {
  readonly password: string;
  readonly hash: string | undefined;
}

/** What a worker thread does. */
export default function matchTask({ password, hash }: PasswordTask): boolean {
  return matchesPassword(password, hash);
}
