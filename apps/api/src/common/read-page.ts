import type { ObjectLiteral, SelectQueryBuilder } from 'typeorm';
import type { Page, PageQuery } from './page.dto';
import { Problem } from './problem';

export interface PageRules {
  /** what `sort` may say → property path in the query, as `{ name: 'production.name' }` */
  sortable: Record<string, string>;
  defaultSort: string;
  /** unique property path that settles ties, so that pages neither repeat nor lose a row */
  tieBreak: string;
  /** property paths that `search` looks in */
  searchIn?: string[];
}

export async function readPage<T extends ObjectLiteral>(
  query: SelectQueryBuilder<T>,
  page: PageQuery,
  rules: PageRules,
): Promise<Page<T>> {
  const sort = page.sort ?? rules.defaultSort;
  const column = Object.hasOwn(rules.sortable, sort) ? rules.sortable[sort] : undefined;
  if (!column) {
    const accepted = Object.keys(rules.sortable).join(', ');
    throw Problem.invalid([
      { path: 'sort', code: 'is-in', message: `sort accepts ${accepted}; read ${JSON.stringify(sort)}` },
    ]);
  }
  if (page.search && rules.searchIn?.length) {
    const any = rules.searchIn.map((path) => `${path} ILIKE :pageSearch`).join(' OR ');
    query.andWhere(`(${any})`, { pageSearch: `%${page.search.replace(/[\\%_]/g, '\\$&')}%` });
  }
  const direction = page.order === 'desc' ? 'DESC' : 'ASC';
  const [items, total] = await query
    .orderBy(column, direction)
    .addOrderBy(rules.tieBreak, direction)
    .skip((page.page - 1) * page.pageSize)
    .take(page.pageSize)
    .getManyAndCount();
  return { items, total, page: page.page, pageSize: page.pageSize };
}
