import type { Problem } from '../../core/api/problem';

/** The same words whether the address is unknown or the password is wrong. */
export function refusalWords({ status, retryAfter, detail }: Problem): string {
  if (status === 429) return `Too many attempts. ${waitWords(retryAfter)}`;
  if (status === 0) return 'The service does not answer. Try again in a moment.';
  if (status === 401 || status === 422)
    return 'That e-mail address and password do not fit together. Check both, or ask an admin of your firm.';
  return detail;
}

function waitWords(seconds: number | null): string {
  if (seconds === null) return 'Wait a few minutes, then try again.';
  if (seconds < 90) return `Try again in ${seconds} seconds.`;
  return `Try again in ${Math.ceil(seconds / 60)} minutes.`;
}
