import type { ProfileRevision } from '../../engine/profiles/profile';
import { Problem } from '../../middleware/problem';
import type { Borrower } from './borrower';
import { revisionAt, standingAt, type ProfileCache, type Profiles } from './profile-cache';
import type { ProfileRow } from './profile-store';

const pattern = /^([a-z0-9]+(?:-[a-z0-9]+)*)(?:@([1-9][0-9]{0,8}))?$/;

interface Reference {
  readonly slug: string;
  readonly revision: number | undefined;
}

function parseReference(text: string): Reference | undefined {
  const match = pattern.exec(text);
  if (!match) return undefined;
  return { slug: match[1] ?? '', revision: match[2] === undefined ? undefined : Number(match[2]) };
}

const mayUse = ({ profiles }: Borrower, slug: string): boolean =>
  profiles === null || profiles.includes(slug);

const inEffect = (rows: readonly ProfileRow[], now: Date): ProfileRow | undefined =>
  rows.find((row) => standingAt(row, now) === 'in-effect');

/** The factor profiles: which revision a request means, and what may be read of them. */
export class ProfileService {
  constructor(
    private readonly cache: ProfileCache,
    private readonly now: () => Date = () => new Date(),
  ) {}

  /**
   * The revision that a check runs under: the one pinned, else the client's own pin, else the
   * newest approved one in effect.
   */
  async resolve(name: string | undefined, borrower: Borrower): Promise<ProfileRevision> {
    const asked = name ?? borrower.defaultProfile;
    if (asked === null)
      throw new Problem('profile-required', 'Name the factor profile that the check runs under.', {
        errors: [
          {
            pointer: '/profile',
            code: 'required',
            message: 'There is no default to take in its place.',
            fix: 'Add "profile"; GET /v1/profiles lists what there is.',
          },
        ],
      });
    const reference = parseReference(asked);
    // A key held to some profiles is told the same of one it may not use and of one there is not.
    if (reference && !mayUse(borrower, reference.slug))
      throw new Problem('profile-not-allowed', 'The key is limited to other factor profiles.');
    const rows = reference && (await this.cache.current()).get(reference.slug);
    if (!rows) throw unknown(`There is no factor profile "${asked.slice(0, 100)}".`);
    const now = this.now();
    const pin = reference.revision ?? ownPin(borrower, reference.slug);
    const found =
      pin === undefined ? inEffect(rows, now) : rows.find(({ revision }) => revision === pin);
    if (found) return revisionAt(found, now);
    if (pin !== undefined) throw unknown(`${reference.slug} has no revision ${pin}.`);
    throw new Problem(
      'profile-not-in-effect',
      `${reference.slug} has no approved revision in effect today.`,
      { errors: [{ pointer: '/profile', code: 'not-in-effect', message: 'None is in effect.' }] },
    );
  }

  async list(borrower: Borrower): Promise<ProfileSummary[]> {
    const profiles = await this.cache.current();
    const allowed = [...profiles].filter(([slug]) => mayUse(borrower, slug));
    return allowed
      .map(([, rows]) => summary(rows, this.now()))
      .filter((each) => each !== undefined)
      .sort((a, b) => (a.slug < b.slug ? -1 : 1));
  }

  /** One revision with all its values; for a slug alone the one in effect, else the newest. */
  async read(name: string, borrower: Borrower): Promise<ProfileDetail> {
    const reference = parseReference(name);
    const found = reference && mayUse(borrower, reference.slug) && (await this.find(reference));
    if (!found) throw new Problem('not-found', 'There is no such factor profile or revision.');
    return detail(found, this.now());
  }

  private async find({ slug, revision }: Reference): Promise<ProfileRow | undefined> {
    const profiles: Profiles = await this.cache.current();
    const rows = profiles.get(slug) ?? [];
    if (revision !== undefined) return rows.find((row) => row.revision === revision);
    return inEffect(rows, this.now()) ?? rows[0];
  }
}

const unknown = (detail: string): Problem =>
  new Problem('unknown-profile', detail, {
    errors: [
      {
        pointer: '/profile',
        code: 'unknown',
        message: detail,
        fix: 'GET /v1/profiles lists what there is.',
      },
    ],
  });

const ownPin = ({ pins }: Borrower, slug: string): number | undefined =>
  Object.hasOwn(pins, slug) ? pins[slug] : undefined;

function facts(row: ProfileRow, now: Date) {
  const { revision, status, sha256, effectiveFrom, expiresAt, approvedAt, approvedBy } = row;
  return {
    revision,
    status,
    standing: standingAt(row, now),
    sha256,
    effectiveFrom,
    expiresAt,
    approvedAt,
    approvedBy,
  };
}

function summary(rows: readonly ProfileRow[], now: Date) {
  const [newest] = rows;
  if (!newest) return undefined;
  const { slug, title, owner } = newest;
  const current = inEffect(rows, now)?.revision ?? null;
  return { slug, title, owner, current, revisions: rows.map((row) => facts(row, now)) };
}

function detail(row: ProfileRow, now: Date) {
  const { slug, title, owner, departures, tree } = row;
  return { slug, title, owner, ...facts(row, now), departures, tree };
}

export type ProfileSummary = NonNullable<ReturnType<typeof summary>>;
export type ProfileDetail = ReturnType<typeof detail>;
