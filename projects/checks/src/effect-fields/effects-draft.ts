import type { QuantityInput, SectionEffects } from '../contract';
import { defined, type FieldReader } from '../form/field-reader';
import { quantityNumber, writeQuantity } from '../quantity/read-quantity';
import type { FieldUnit } from '../quantity/units';

type Signed = Exclude<keyof SectionEffects, 'compression' | 'tension'>;

/** Which way the axial force acts: it is never signed. */
export type Axial = 'compression' | 'tension';

/** Design effects as they are typed. */
export interface EffectsDraft {
  readonly kept: SectionEffects | undefined;
  readonly axial: Axial;
  /** The size of the axial force. */
  readonly force: string;
  readonly texts: Readonly<Record<Signed, string>>;
}

/** The unit of each signed effect, in the order of the request. */
export const effectUnits: Readonly<Record<Signed, FieldUnit>> = {
  My: 'kN m',
  Mz: 'kN m',
  Vy: 'kN',
  Vz: 'kN',
  T: 'kN m',
  stVenant: 'kN m',
  warping: 'kN m',
  bimoment: 'kN m^2',
};

const SIGNED = Object.keys(effectUnits) as Signed[];
/** The parts of a torsion that an open section splits it into. */
const PARTS: readonly Signed[] = ['stVenant', 'warping', 'bimoment'];

/** A request's effects as the form shows them. */
export function writeEffects(kept: SectionEffects | undefined): EffectsDraft {
  const axial = kept?.tension === undefined ? 'compression' : 'tension';
  const texts = Object.fromEntries(SIGNED.map((name) => [name, writeQuantity(kept?.[name])]));
  return {
    kept,
    axial,
    force: writeQuantity(kept?.[axial]),
    texts: texts as EffectsDraft['texts'],
  };
}

/** The effects as a request names them; undefined where none is typed. */
export function readEffects(draft: EffectsDraft, reader: FieldReader): SectionEffects | undefined {
  const { kept, axial, force, texts } = draft;
  const shown = writeEffects(kept);
  if (kept && JSON.stringify(draft) === JSON.stringify(shown)) return kept;
  const pointer = `/effects/${axial}`;
  const size = reader.quantity(pointer, force, 'kN');
  if ((quantityNumber(size, 'kN') ?? 0) < 0)
    reader.fault(pointer, 'An axial force has no sign here: choose compression or tension.');
  const made: Record<string, QuantityInput | undefined> = { [axial]: size };
  for (const name of SIGNED)
    made[name] = reader.quantity(`/effects/${name}`, texts[name], effectUnits[name]);
  const given: SectionEffects = defined(made);
  return Object.keys(given).length === 0 ? undefined : given;
}

/** Whether anything is typed. */
export function isEffectGiven({ force, texts }: EffectsDraft): boolean {
  return [force, ...Object.values(texts)].some((text) => text.trim() !== '');
}

/** Whether the parts of a torsion are shown: on open sections, and wherever one is typed. */
export function showsParts({ texts }: EffectsDraft, isOpen: boolean): boolean {
  return isOpen || PARTS.some((name) => texts[name].trim() !== '');
}

/** The pointers of the fields that the form shows of the effects. */
export function effectPointers({ axial }: EffectsDraft): string[] {
  return ['/effects', `/effects/${axial}`, ...SIGNED.map((name) => `/effects/${name}`)];
}
