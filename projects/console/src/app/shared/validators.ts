import { type ValidatorFn, Validators } from '@angular/forms';

/** Something stands in the field. */
export const required: ValidatorFn = (control) => Validators.required(control);

/** Words, at most this many letters: blanks alone are none. */
export const wording = (most: number): ValidatorFn[] => [
  required,
  Validators.pattern(/\S/),
  Validators.maxLength(most),
];
