import { Piscina } from 'piscina';
import { awayProblem } from '../../middleware/problem';
import type { MatchPassword } from './password';
import type { PasswordTask } from './password-thread';

const maxQueue = 32;

/** A thread of its own for passwords: neither checks nor answers wait for a sign-in. */
export function passwordPool(filename: string): {
  match: MatchPassword;
  close: () => Promise<void>;
} {
  const pool = new Piscina<PasswordTask, boolean>({
    filename,
    minThreads: 0,
    maxThreads: 1,
    idleTimeout: 30_000,
    maxQueue,
  });
  return {
    match: async (password, hash) => {
      if (pool.queueSize >= maxQueue) throw awayProblem('busy');
      return await pool.run({ password, hash });
    },
    close: () => pool.destroy(),
  };
}
