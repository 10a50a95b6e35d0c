import { Refusal } from '../refusal';
import type { CheckAnswer, LoadInput, WalerRequest } from '../checks/contract';
import { waler } from '../checks/waler/waler';
import { publishedRevision } from './profiles';

/** A waler that passes: north face, three spans, both flanges held all along. */
export const northFace: WalerRequest = {
  material: { type: 'steel', grade: 'S275' },
  section: 'UB 457x191x67',
  loadBasis: 'characteristic',
  spans: [3, 3, 2.4],
  loads: [
    { name: 'earth', nature: 'permanent', kind: 'uniform', value: 95 },
    { name: 'surcharge', nature: 'variable', category: 'surcharge', kind: 'uniform', value: 22 },
  ],
  restraint: 'full',
  deflectionLimit: 'span/200',
  waive: [{ verification: 'transverse-force', reason: 'web stiffened at every prop' }],
};

export function runWaler(
  change: Partial<WalerRequest> = {},
  profile = 'en-recommended',
  detail: 'full' | 'summary' = 'full',
): CheckAnswer {
  // Load sets come in place of loads.
  const { loads, ...rest } = northFace;
  const base = change.loadSets || !loads ? rest : { ...rest, loads };
  return waler.run({ ...base, ...change }, { profile: publishedRevision(profile), detail });
}

/** The verification of an answer by its id. */
export function verification(answer: CheckAnswer, id: string) {
  const found = answer.verifications.find((one) => one.id === id);
  if (!found) throw new Error(`${id} was not verified`);
  return found;
}

/** One permanent uniform load in kN/m. */
export function uniform(value: number): LoadInput[] {
  return [{ name: 'earth', nature: 'permanent', kind: 'uniform', value }];
}

/** The refusal of a waler's request that the engine will not answer. */
export function refusalOf(change: Partial<WalerRequest>, profile?: string): Refusal {
  try {
    runWaler(change, profile);
  } catch (error) {
    if (error instanceof Refusal) return error;
    throw error;
  }
  throw new Error('the check was made');
}
