import { ValidationPipe, type ValidationError } from '@nestjs/common';
import { Problem, type ProblemField } from './problem';

const NEVER_REPEATED = /password|token|secret/i;

/** Reads every body, query and parameter object; unknown keys are refused, all faults are named at once. */
export function createValidationPipe(): ValidationPipe {
  return new ValidationPipe({
    whitelist: true,
    forbidNonWhitelisted: true,
    transform: true,
    exceptionFactory: (errors) => Problem.invalid(errors.flatMap((error) => fieldsOf(error, ''))),
  });
}

function fieldsOf(error: ValidationError, parent: string): ProblemField[] {
  const path = parent ? `${parent}.${error.property}` : error.property;
  const own = Object.entries(error.constraints ?? {}).map(([rule, message]) => ({
    path,
    code: rule.replace(/([a-z])([A-Z])/g, '$1-$2').toLowerCase(),
    message: `${message}${readWords(path, error.value)}`,
  }));
  return [...own, ...(error.children ?? []).flatMap((child) => fieldsOf(child, path))];
}

function readWords(path: string, value: unknown): string {
  if (NEVER_REPEATED.test(path)) return '';
  if (value === undefined) return '; nothing was sent';
  const text = JSON.stringify(value);
  return text.length <= 80 ? `; read ${text}` : '';
}
