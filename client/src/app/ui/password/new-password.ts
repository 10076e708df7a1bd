import { type ValidatorFn, Validators } from '@angular/forms';

const SHORTEST = 12;

/** What a password that somebody chooses must meet; the server decides. */
export const PASSWORD_VALIDATORS: ValidatorFn[] = [
  Validators.required,
  Validators.minLength(SHORTEST),
];

/** What to say when it does not. */
export const PASSWORD_MESSAGES = {
  required: 'Choose a password of at least 12 characters.',
  minlength: 'Use at least 12 characters.',
};

/** What to say before anything was typed. */
export const PASSWORD_HELP = 'At least 12 characters; several words are fine.';
