import type { Step, WorkingSheet } from '../formula/sheet';
import type { ProfileReader } from '../profiles/reader';
import { ENGINE_VERSION } from '../version';
import type { Detail } from './check';
import type {
  AdvisoryAnswer,
  CheckAnswer,
  CombinationLine,
  Diagrams,
  MissingItem,
  ReactionAnswer,
  VerificationAnswer,
} from './contract';

/** The caution that goes with every answer. */
export const NOTICE =
  'For competent persons. Covers only the verifications listed. Local codes, the firm’s procedures and licensed practice prevail.';

/** What a check has found, before the answer's own order and status. */
export interface Findings {
  readonly check: CheckAnswer['check'];
  readonly detail: Detail;
  readonly profile: ProfileReader;
  readonly common: WorkingSheet;
  readonly verifications: readonly VerificationAnswer[];
  readonly steps: readonly Step[];
  readonly missing: readonly MissingItem[];
  readonly waived: CheckAnswer['waived'];
  readonly notCovered: readonly string[];
  readonly advisories: readonly AdvisoryAnswer[];
  readonly standards: readonly string[];
  /** Of a member under loads. */
  readonly member?: MemberFindings;
}

/** What only a member under loads has. */
export interface MemberFindings {
  readonly reactions: ReactionAnswer[];
  /** Made only for a full answer. */
  readonly combinations: () => CombinationLine[];
  readonly diagrams: () => Diagrams;
}

export function assemble(findings: Findings): CheckAnswer {
  const { check, detail, verifications, profile } = findings;
  const governing = governingOf(verifications);
  const answer: CheckAnswer = {
    check,
    status: statusOf(findings),
    utilisation: governing?.utilisation ?? null,
    governing: governing?.id ?? null,
    missing: [...findings.missing],
    waived: findings.waived,
    notCovered: [...findings.notCovered],
    verifications: [...verifications],
    values: { ...findings.common.values, ...governing?.values },
    ...(findings.member && { reactions: findings.member.reactions }),
    profile: stampOf(profile),
    advisories: [...findings.advisories],
    basis: { standards: [...findings.standards], engine: ENGINE_VERSION },
    record: null,
    notice: NOTICE,
  };
  if (detail === 'summary') return answer;
  return {
    ...answer,
    steps: [...findings.common.steps, ...findings.steps],
    ...(findings.member && {
      combinations: listed(findings.member, verifications),
      diagrams: findings.member.diagrams(),
    }),
  };
}

/** More combinations than anyone reads: then only those that the answer names are listed. */
const MOST_LISTED = 500;

function listed(
  { combinations, reactions }: MemberFindings,
  verifications: Findings['verifications'],
): CombinationLine[] {
  const all = combinations();
  if (all.length <= MOST_LISTED) return all;
  const named = new Set<string | null | undefined>(
    reactions.flatMap(({ design }) => [
      design.persistent?.combination,
      design.accidental?.combination,
    ]),
  );
  for (const { combination } of verifications) named.add(combination);
  return all.filter(({ id }) => named.has(id));
}

/**
 * Failure outranks all; a pass is what holds, misses nothing and stands on confirmed factors in
 * effect.
 */
function statusOf({ verifications, missing, profile }: Findings): CheckAnswer['status'] {
  if (verifications.some(({ status }) => status === 'fail')) return 'fail';
  if (missing.length > 0 || verifications.length === 0) return 'incomplete';
  const confirmed = profile.unconfirmed().length === 0;
  return confirmed && profile.revision.standing === 'in-effect' ? 'pass' : 'provisional';
}

/** The greatest utilisation; a criterion without resistance stands above every number. */
function governingOf(verifications: readonly VerificationAnswer[]): VerificationAnswer | undefined {
  const rank = ({ utilisation }: VerificationAnswer): number => utilisation ?? Infinity;
  return verifications.reduce<VerificationAnswer | undefined>(
    (worst, one) => (worst === undefined || rank(one) > rank(worst) ? one : worst),
    undefined,
  );
}

function stampOf(profile: ProfileReader): CheckAnswer['profile'] {
  const { slug, revision, title, status, standing, sha256, departures } = profile.revision;
  return {
    slug,
    revision,
    title,
    status,
    standing,
    sha256,
    departures: departures.map((one) => ({ ...one })),
    unconfirmed: profile.unconfirmed(),
  };
}
