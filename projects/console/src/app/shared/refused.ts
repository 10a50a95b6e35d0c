import type { AbstractControl } from '@angular/forms';
import type { Problem } from '../core/api/problem';

/**
 * Puts the service's own messages beside the fields they are about.
 *
 * @returns whether every fault found a field; what found none is for the form as a whole.
 */
export function refusedBy(
  problem: Problem,
  fields: Readonly<Record<string, AbstractControl>>,
): boolean {
  const pointers = Object.keys(fields);
  for (const pointer of pointers) {
    const message = problem.at(pointer);
    if (message === undefined) continue;
    fields[pointer]?.setErrors({ refused: message });
    fields[pointer]?.markAsTouched();
  }
  const isShown = (place: string) =>
    pointers.some((pointer) => place === pointer || place.startsWith(`${pointer}/`));
  return problem.errors.length > 0 && problem.errors.every((item) => isShown(item.pointer));
}
