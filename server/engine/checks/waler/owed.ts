import type {
  CheckAnswer,
  MissingItem,
  VerificationId,
  WaiverInput,
  WalerRequest,
} from '../contract';
import { refuse } from '../refuse';
import { instantRatio } from './deflection';

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
  if (!deflectionMade) owe(deflectionItem(request));
  return missing;
}

function deflectionItem(request: WalerRequest): MissingItem {
  const base = { verification: 'deflection', clause: 'EN 1990 6.5' } as const;
  return instantRatio(request.deflectionLimit) === undefined
    ? {
        ...base,
        pointer: '/deflectionLimit',
        reason: 'No limit of the deflection is given, and the profile holds none.',
      }
    : {
        ...base,
        pointer: '/loadSets',
        reason: 'Design values say nothing of serviceability; give a load set for it.',
      };
}
