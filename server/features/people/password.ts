import bcrypt from 'bcryptjs';

/** bcrypt reads no further: what stands behind the 72nd byte would not count. */
export const maxPasswordBytes = 72;
export const passwordCost = 11;

/** One spelling of letters that can be written in several ways. */
const plain = (password: string): string => password.normalize('NFKC');

export const fitsPassword = (password: string): boolean =>
  Buffer.byteLength(plain(password)) <= maxPasswordBytes;

/** @throws when the password has more than 72 bytes. */
export function hashPassword(password: string, cost = passwordCost): string {
  if (!fitsPassword(password)) throw new Error('A password has at most 72 bytes.');
  return bcrypt.hashSync(plain(password), cost);
}

/** Of no password: something to compare with where there is no person. */
export const nobodysHash = '$2b$11$rYqzCwCavLFg7hY0aw5hV./UJ15b601r57U30s8xzQw6lkYl1XdRy';

/** Takes the same time for a person that there is not, and for a password that is too long. */
export function matchesPassword(password: string, hash: string | undefined): boolean {
  const fits = fitsPassword(password);
  const same = bcrypt.compareSync(fits ? plain(password) : '', hash ?? nobodysHash);
  return same && fits && hash !== undefined;
}

/** Compares passwords; the service does it in worker threads, for it takes a tenth of a second. */
export type MatchPassword = (password: string, hash: string | undefined) => Promise<boolean>;

export const matchHere: MatchPassword = (password, hash) =>
  Promise.resolve(matchesPassword(password, hash));
