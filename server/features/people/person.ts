import type { Permission, Role } from './policy';

export interface Person {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly roles: readonly Role[];
}

/** A person with what the session lends them. */
export interface SignedIn extends Person {
  readonly permissions: ReadonlySet<Permission>;
  /** Every request that changes something carries it. */
  readonly csrfToken: string;
}
