import { applyDecorators } from '@nestjs/common';
import { Transform } from 'class-transformer';
import { IsOptional } from 'class-validator';

/** A field that may be left out; sent as null it is left out too. */
export function MayBeLeftOut(): PropertyDecorator {
  return applyDecorators(
    IsOptional(),
    Transform(({ value }: { value: unknown }) => value ?? undefined),
  );
}
