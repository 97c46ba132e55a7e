import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsEmail, IsOptional, IsString, Length, Matches, MaxLength } from 'class-validator';

const trimmed = Transform(({ value }: { value: unknown }) =>
  typeof value === 'string' ? value.trim() : value,
);

/** One line of text without control characters, trimmed. */
export function Line(least: number, most: number, { optional = false } = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ minLength: least, maxLength: most, required: !optional }),
    ...(optional ? [IsOptional()] : []),
    trimmed,
    IsString(),
    Length(least, most),
    Matches(/^[^\p{Cc}\p{Cs}]*$/u, { message: '$property must be one line without control characters' }),
  );
}

export function EmailAddress(): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ format: 'email', maxLength: 254 }),
    trimmed,
    IsEmail(),
    MaxLength(254),
  );
}

export function Password(): PropertyDecorator {
  return applyDecorators(ApiProperty({ minLength: 10, maxLength: 200 }), IsString(), Length(10, 200));
}

/** A token out of a mailed link. */
export function MailedTokenText(): PropertyDecorator {
  return applyDecorators(ApiProperty(), IsString(), Length(20, 100));
}
