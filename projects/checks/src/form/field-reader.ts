import type { QuantityInput } from '../contract';
import { readList } from '../quantity/read-list';
import { readQuantity, type Choice } from '../quantity/read-quantity';
import type { FieldUnit } from '../quantity/units';

/** What is wrong with one field, beside which it is shown. */
export interface FieldFault {
  /** JSON pointer of the field. */
  readonly pointer: string;
  readonly message: string;
  /** Ways to read the text, where it can be read in two. */
  readonly choices?: readonly Choice[];
  /** What to do, where it is known. */
  readonly fix?: string;
}

/** A form as a request, or why it is none yet. */
export interface DraftReading<Request> {
  /** The request; null while a field cannot be read or something it needs is not given. */
  readonly request: Request | null;
  readonly faults: readonly FieldFault[];
  /** What is not given yet, in words. */
  readonly wanting: readonly string[];
}

/** Reads single fields and gathers what is wrong with them. */
export class FieldReader {
  readonly faults: FieldFault[] = [];

  quantity(pointer: string, text: string, unit: FieldUnit): QuantityInput | undefined {
    const reading = readQuantity(text, unit);
    if (reading.state === 'ok') return reading.value.json;
    if (reading.state === 'wrong') this.fault(pointer, reading.message, reading.choices);
    return undefined;
  }

  /** A quantity that must be given. */
  needed(pointer: string, text: string, unit: FieldUnit): QuantityInput | undefined {
    if (text.trim() === '') this.fault(pointer, 'Give a value.');
    return this.quantity(pointer, text, unit);
  }

  list(pointer: string, text: string, unit: FieldUnit): QuantityInput[] | undefined {
    const reading = readList(text, unit);
    if (reading.state === 'ok') return reading.value.map(({ json }) => json);
    if (reading.state === 'wrong') this.fault(pointer, reading.message, reading.choices);
    return undefined;
  }

  fault(pointer: string, message: string, choices?: readonly Choice[]): void {
    this.faults.push({ pointer, message, ...(choices && { choices }) });
  }

  /** The request of what was read, or none where something is wrong or wanting. */
  reading<Request>(made: object, wanting: readonly string[]): DraftReading<Request> {
    const complete = this.faults.length === 0 && wanting.length === 0;
    return {
      request: complete ? (defined(made) as Request) : null,
      faults: this.faults,
      wanting,
    };
  }
}

/** Without the fields that hold nothing, in the order in which the contract names them. */
export function defined(made: object): object {
  return Object.fromEntries(Object.entries(made).filter(([, value]) => value !== undefined));
}
