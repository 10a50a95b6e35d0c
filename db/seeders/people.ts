import { randomInt } from 'node:crypto';
import type { Sequelize } from 'sequelize';
import { hashPassword } from '../../server/features/people/password';
import type { Role } from '../../server/features/people/policy';
import { AuditEvent, User } from '../models';

/** How somebody of the scenario signs in on this machine. */
export interface DemoPerson {
  readonly email: string;
  readonly role: Role;
  readonly password: string;
  /** Tells whether the password still is the one, without the time it takes to try it. */
  readonly passwordHash: string;
}

/** The people of the invented firm, one for each role; no person of that name is meant. */
const people: readonly { readonly role: Role; readonly name: string }[] = [
  { role: 'admin', name: 'Asha Verrall' },
  { role: 'lead', name: 'Tomos Kettley' },
  { role: 'engineer', name: 'Ines Marrow' },
  { role: 'checker', name: 'Joost Pellam' },
  { role: 'developer', name: 'Rafi Dunmore' },
];

/** Without the letters and digits that are taken for each other: it is read off a screen. */
const letters = 'abcdefghjkmnpqrstuvwxyz23456789';

/** 20 letters of 31: 99 bits. */
const makePassword = (): string =>
  Array.from({ length: 4 }, () =>
    Array.from({ length: 5 }, () => letters.charAt(randomInt(letters.length))).join(''),
  ).join('-');

/**
 * Adds whoever is missing, as the owner.
 *
 * @param known what an earlier start made; kept while it still opens.
 * @returns everybody, with the password to sign in.
 */
export async function seedPeople(
  owner: Sequelize,
  known: readonly DemoPerson[],
): Promise<DemoPerson[]> {
  const seeded: DemoPerson[] = [];
  for (const { role, name } of people) {
    const email = `${role}@saltmarsh.example`;
    const row = await User.findOne({ where: { email } });
    const kept = known.find((each) => each.email === email);
    if (kept && row?.passwordHash === kept.passwordHash) {
      seeded.push(kept);
      continue;
    }
    const password = makePassword();
    const passwordHash = hashPassword(password);
    await owner.transaction(async (transaction) => {
      const [person, made] = await User.findOrCreate({
        where: { email },
        defaults: { email, name, passwordHash, roles: [role] },
        transaction,
      });
      if (!made) await person.update({ passwordHash }, { transaction });
      const action = made ? 'person.made' : 'person.password-made';
      const subject = `person:${person.id}`;
      await AuditEvent.create({ actor: 'the start command', action, subject }, { transaction });
    });
    seeded.push({ email, role, password, passwordHash });
  }
  return seeded;
}
