import {
  applyDecorators,
  type ArgumentMetadata,
  type Type,
  type ValidationError,
  ValidationPipe,
} from '@nestjs/common';
import { IsObject } from 'class-validator';
import { Problem, type ProblemField } from './problem';

const NEVER_REPEATED = /password|token|secret/i;

const verbatim = new WeakMap<object, string[]>();

/**
 * An object that is handed on just as it was parsed, because a reader of its own follows. Copying and walking a whole
 * document here, only to have it read again, would be a good part of the cost of a save.
 */
export function Verbatim(): PropertyDecorator {
  return applyDecorators(IsObject(), (prototype: object, name: string | symbol) => {
    verbatim.set(prototype, [...(verbatim.get(prototype) ?? []), String(name)]);
  });
}

/** Lays the verbatim objects aside while the rest is read. */
class BodyPipe extends ValidationPipe {
  override async transform(value: unknown, metadata: ArgumentMetadata): Promise<unknown> {
    const names = metadata.metatype && verbatim.get((metadata.metatype as Type<object>).prototype as object);
    if (!names || !isObject(value)) return super.transform(value, metadata);
    const aside = Object.fromEntries(
      names.filter((name) => isObject(value[name])).map((name) => [name, value[name]]),
    );
    const stood = Object.fromEntries(Object.keys(aside).map((name) => [name, {}]));
    return Object.assign((await super.transform({ ...value, ...stood }, metadata)) as object, aside);
  }
}

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** Reads every body, query and parameter object; unknown keys are refused, all faults are named at once. */
export function createValidationPipe(): ValidationPipe {
  return new BodyPipe({
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
