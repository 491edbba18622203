import { type AbstractControl, type ValidatorFn } from '@angular/forms';
import { type z } from 'zod';
import { type ProblemError } from '../api-client/problem-error';

/**
 * Puts the messages of a problem at the fields they are about, by JSON pointer.
 *
 * @returns whether every message found its field, so that nothing is left to say elsewhere
 */
export function showAtFields(problem: ProblemError, fields: Record<string, AbstractControl>): boolean {
  let found = 0;
  for (const { pointer, detail } of problem.errors) {
    const field = fields[pointer];
    if (!field) continue;
    field.setErrors({ said: sentence(detail) });
    field.markAsTouched();
    found += 1;
  }
  return found > 0 && found === problem.errors.length;
}

/** Holds a field to a schema of the contracts; the first message of the schema is the field's. Empty is left to `required`. */
export function fits(schema: z.ZodType): ValidatorFn {
  return ({ value }: AbstractControl<string>) => {
    if (value.trim() === '') return null;
    const result = schema.safeParse(value.trim());
    return result.success ? null : { said: sentence(result.error.issues[0]?.message ?? 'This cannot be used') };
  };
}

function sentence(text: string): string {
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}${/[.!?]$/.test(text) ? '' : '.'}`;
}
