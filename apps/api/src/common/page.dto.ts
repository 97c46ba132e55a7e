import type { Type } from '@nestjs/common';
import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type as AsType } from 'class-transformer';
import { IsIn, IsInt, IsOptional, IsString, Max, MaxLength, Min } from 'class-validator';
import { TextField } from './text-field';

export class PageQuery {
  @ApiPropertyOptional({ default: 1, minimum: 1 })
  @IsOptional()
  @AsType(() => Number)
  @IsInt()
  @Min(1)
  @Max(1_000_000)
  page = 1;

  @ApiPropertyOptional({ default: 50, minimum: 1, maximum: 200 })
  @IsOptional()
  @AsType(() => Number)
  @IsInt()
  @Min(1)
  @Max(200)
  pageSize = 50;

  @ApiPropertyOptional()
  @IsOptional()
  @IsString()
  @MaxLength(40)
  sort?: string;

  @ApiPropertyOptional({ enum: ['asc', 'desc'], default: 'asc' })
  @IsOptional()
  @IsIn(['asc', 'desc'])
  order: 'asc' | 'desc' = 'asc';

  @ApiPropertyOptional()
  @IsOptional()
  @TextField({ max: 200 })
  search?: string;
}

export interface Page<T> {
  items: T[];
  total: number;
  page: number;
  pageSize: number;
}

/** The answer of a list route: `@ApiOkResponse({ type: PageOf(ProductionDto) })`. */
export function PageOf<T>(item: Type<T>): Type<Page<T>> {
  const known = made.get(item);
  if (known) return known as Type<Page<T>>;
  class PageDto implements Page<T> {
    @ApiProperty({ type: [item] })
    items: T[];
    @ApiProperty()
    total: number;
    @ApiProperty()
    page: number;
    @ApiProperty()
    pageSize: number;
  }
  Object.defineProperty(PageDto, 'name', { value: `${item.name.replace(/Dto$/, '')}Page` });
  made.set(item, PageDto);
  return PageDto;
}

const made = new Map<Type<unknown>, Type<unknown>>();
