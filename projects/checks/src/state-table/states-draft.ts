import type { QuantityInput, StressRequest } from '../contract';
import { nextId } from '../form/draft';
import { defined, type FieldReader } from '../form/field-reader';
import { writeQuantity } from '../quantity/read-quantity';

type State = NonNullable<StressRequest['states']>[number];
export type StressComponent = keyof State;

/** A state of stress as it is typed. */
export interface StateRow {
  /** Tells rows apart while they move; never sent. */
  readonly id: number;
  readonly sigmaX: string;
  readonly sigmaZ: string;
  readonly tau: string;
}

/** The three parts of a plane state of stress. */
export const stressComponents: readonly StressComponent[] = ['sigmaX', 'sigmaZ', 'tau'];

/** A row for a state; an empty one without it. */
export function stateRow(state: State = {}): StateRow {
  return {
    id: nextId(),
    sigmaX: writeQuantity(state.sigmaX),
    sigmaZ: writeQuantity(state.sigmaZ),
    tau: writeQuantity(state.tau),
  };
}

/** Whether nothing was typed into a row. */
export function isEmptyState(row: StateRow): boolean {
  return stressComponents.every((name) => row[name].trim() === '');
}

/** The numbers that the answer knows the rows by; none for an empty row before one that is sent. */
export function stateNumbers(rows: readonly StateRow[]): (number | null)[] {
  const counted = rows.map((row) => !isEmptyState(row));
  const last = counted.lastIndexOf(true);
  let number = 0;
  return counted.map((counts, index) => (counts || index > last ? (number += 1) : null));
}

/** A row's place among the states that are sent. */
export function statePointer(rows: readonly StateRow[], row: StateRow): string {
  const index = rows.filter((one) => !isEmptyState(one)).indexOf(row);
  return `/states/${index < 0 ? rows.length : index}`;
}

/** The states as a request names them; rows with nothing in them are left out. */
export function readStates(rows: readonly StateRow[], reader: FieldReader): State[] {
  return rows
    .filter((row) => !isEmptyState(row))
    .map((row, index) => {
      const made: Partial<Record<StressComponent, QuantityInput | undefined>> = {};
      for (const name of stressComponents)
        made[name] = reader.quantity(`/states/${index}/${name}`, row[name], 'N/mm^2');
      return defined(made);
    });
}
