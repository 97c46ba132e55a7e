import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { IsString, Matches, MaxLength, MinLength } from 'class-validator';

// Lone halves of a surrogate pair and control characters cannot be stored or printed.
const ONE_LINE = /^[^\p{Cc}\p{Cs}\u2028\u2029]*$/u;
const LINES = /^(?:[^\p{Cc}\p{Cs}]|[\t\n\r])*$/u;

export interface TextRules {
  min?: number;
  max: number;
  /** Line breaks and tabs are accepted too. */
  lines?: boolean;
}

export function isStorableText(text: string, lines = false): boolean {
  return (lines ? LINES : ONE_LINE).test(text);
}

/** Text a person typed: trimmed, within a length, and plain; markup in it is only text. */
export function TextField({ min = 0, max, lines = false }: TextRules): PropertyDecorator {
  return applyDecorators(
    Transform(({ value }: { value: unknown }) => (typeof value === 'string' ? value.trim() : value)),
    IsString(),
    MinLength(min),
    MaxLength(max),
    Matches(lines ? LINES : ONE_LINE, {
      message: '$property may not hold control characters' + (lines ? '' : ' or line breaks'),
    }),
  );
}
