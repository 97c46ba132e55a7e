import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { IsEmail, IsOptional, IsString, Length } from 'class-validator';
import { TextField } from './text-field';

/** One line of text, trimmed. */
export function Line(least: number, most: number, { optional = false } = {}): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ minLength: least, maxLength: most, required: !optional }),
    ...(optional ? [IsOptional()] : []),
    TextField({ min: least, max: most }),
  );
}

export function EmailAddress(): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ format: 'email', maxLength: 254 }),
    TextField({ max: 254 }),
    IsEmail(),
  );
}

export function Password(): PropertyDecorator {
  return applyDecorators(ApiProperty({ minLength: 10, maxLength: 200 }), IsString(), Length(10, 200));
}

/** A token out of a mailed link. */
export function MailedTokenText(): PropertyDecorator {
  return applyDecorators(ApiProperty(), IsString(), Length(20, 100));
}
