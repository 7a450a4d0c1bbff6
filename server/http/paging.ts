import { z } from 'zod';
import { pageQuerySchema, type Page, type PageQuery } from '../../shared/paging.ts';

/** A page of a list, and what its rows must contain. */
export const listQuerySchema = pageQuerySchema.extend({ q: z.string().trim().max(100).default('') });
export type ListQuery = z.infer<typeof listQuerySchema>;

/** LIMIT and OFFSET for a page. */
export const rowsOf = ({ page, pageSize }: PageQuery) => ({ limit: pageSize, offset: (page - 1) * pageSize });

/** Rows as a list route answers them. */
export function toPage<T>(items: T[], total: number, { page, pageSize }: PageQuery): Page<T> {
  return { items, page, pageSize, total };
}
