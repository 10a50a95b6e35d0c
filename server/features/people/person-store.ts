import { User } from '../../../db/models';
import type { Person } from './person';
import { isRole } from './policy';

/** A person as asked for at the sign-in. */
export interface Account {
  readonly person: Person;
  readonly passwordHash: string;
  readonly disabled: boolean;
}

export interface PersonStore {
  /** Nobody who is out of use. */
  find(id: string): Promise<Person | undefined>;
  account(email: string): Promise<Account | undefined>;
  noteSignIn(id: string): Promise<void>;
}

const toPerson = ({ id, email, name, roles }: User): Person => ({
  id,
  email,
  name,
  roles: roles.filter(isRole),
});

export class DatabasePersonStore implements PersonStore {
  async find(id: string): Promise<Person | undefined> {
    const row = await User.findOne({ where: { id, disabledAt: null } });
    return row ? toPerson(row) : undefined;
  }

  async account(email: string): Promise<Account | undefined> {
    const row = await User.findOne({ where: { email } });
    if (!row) return undefined;
    const { passwordHash, disabledAt } = row;
    return { person: toPerson(row), passwordHash, disabled: disabledAt !== null };
  }

  async noteSignIn(id: string): Promise<void> {
    await User.update({ lastSignIn: new Date() }, { where: { id } });
  }
}
