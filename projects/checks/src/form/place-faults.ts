import type { ProblemItem } from '../contract';
import type { FieldFault } from './field-reader';

/** What is wrong, sorted into what stands beside a field and what no field shows. */
export interface PlacedFaults {
  readonly beside: ReadonlyMap<string, FieldFault>;
  readonly rest: readonly FieldFault[];
}

/** What a form shows, for faults to find their place. */
export interface ShownFields {
  /** Every field that the form shows as it stands, by its JSON pointer. */
  readonly pointers: ReadonlySet<string>;
  /** Fields that the service names by their whole and the form shows by a part. */
  readonly parts?: Readonly<Record<string, string>>;
}

/** Puts each fault beside the nearest field that shows what it points at. */
export function placeFaults(
  { pointers, parts = {} }: ShownFields,
  faults: readonly (FieldFault | ProblemItem)[],
): PlacedFaults {
  const beside = new Map<string, FieldFault>();
  const rest: FieldFault[] = [];
  for (const fault of faults) {
    const place = nearest(fault.pointer, pointers, parts);
    const known = place === undefined ? undefined : beside.get(place);
    if (place === undefined || (known && known.message !== fault.message)) rest.push(fault);
    else beside.set(place, fault);
  }
  return { beside, rest };
}

function nearest(
  pointer: string,
  shown: ReadonlySet<string>,
  parts: Readonly<Record<string, string>>,
): string | undefined {
  for (let at = pointer; at !== ''; at = at.slice(0, at.lastIndexOf('/'))) {
    if (shown.has(at)) return at;
    const part = parts[at] ?? `${at}/0`;
    if (shown.has(part)) return part;
  }
  return undefined;
}
