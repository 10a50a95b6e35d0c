import type {
  CheckAnswer,
  MissingItem,
  VerificationId,
  WaiverInput,
  WalerRequest,
} from '../contract';
import { refuse } from '../refuse';
import type { SolvedCases } from '../continuous/solve';
import { limitsOf } from './deflection';

/** What a waler owes and the caller may take upon themselves (contract, section 5). */
const waivable: ReadonlySet<VerificationId> = new Set<VerificationId>([
  'transverse-force',
  'lateral-torsional-buckling',
  'deflection',
]);

/** The waivers of a request, each one owed and named once. */
export function readWaivers(waive: readonly WaiverInput[] = []): CheckAnswer['waived'] {
  const seen = new Set<VerificationId>();
  waive.forEach(({ verification }, index) => {
    const pointer = `/waive/${index}/verification`;
    if (!waivable.has(verification)) {
      refuse(
        'cannot-be-waived',
        pointer,
        `"${verification}" is not among what a waler owes and a caller may waive: ${[...waivable].join(', ')}.`,
      );
    }
    if (seen.has(verification)) refuse('duplicate', pointer, `"${verification}" is waived twice.`);
    seen.add(verification);
  });
  return waive.map(({ verification, reason }) => ({ verification, reason }));
}

/** Owed verifications that are neither made nor waived. */
export function missingOf(
  request: WalerRequest,
  waived: CheckAnswer['waived'],
  { cases, arrangementsComplete }: SolvedCases,
  deflectionMade: boolean,
): MissingItem[] {
  const missing: MissingItem[] = [];
  const owe = (item: MissingItem): void => {
    if (!waived.some(({ verification }) => verification === item.verification)) missing.push(item);
  };
  if (request.restraint !== 'full') {
    owe({
      pointer: '/restraint',
      verification: 'lateral-torsional-buckling',
      reason:
        'The flanges are not held all along, and this version of the check does not verify the segments between restraints.',
      clause: 'EN 1993-1-1 6.3.2',
    });
  }
  owe({
    pointer: '/bearing',
    verification: 'transverse-force',
    reason: 'This version of the check does not verify the web at the props.',
    clause: 'EN 1993-1-5 6',
  });
  // Under a mechanism nothing deflects; the answer is a failure already.
  const stands = cases.every(({ state }) => state !== null);
  if (!deflectionMade && stands) owe(deflectionItem(request));
  if (!cases.some(({ combination }) => combination.situation === 'persistent')) {
    missing.push({
      pointer: '/loadSets',
      verification: 'bending-y',
      reason: 'No loads of the persistent situation are given: strength was not verified for it.',
      clause: 'EN 1990 3.2',
    });
  }
  if (!arrangementsComplete) {
    missing.push({
      pointer: '/patternLoading',
      verification: 'bending-y',
      reason:
        'Supports lift or give, or loads turn the member, over more spans than every arrangement of the variable loads is solved for; others than those solved may do more.',
      clause: 'EN 1990 6.4.3.1(4)',
    });
  }
  return missing;
}

function deflectionItem(request: WalerRequest): MissingItem {
  const base = { verification: 'deflection', clause: 'EN 1990 6.5' } as const;
  return limitsOf(request.deflectionLimit).length === 0
    ? {
        ...base,
        pointer: '/deflectionLimit',
        reason: 'No limit of the deflection is given, and the profile holds none.',
      }
    : {
        ...base,
        pointer: '/loadSets',
        reason: 'No loads of serviceability are given; give a load set for it.',
      };
}
