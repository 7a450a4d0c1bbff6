import { z } from 'zod';

/** The most rows one page may hold. */
export const PAGE_SIZE_MAX = 100;

/** `?page=2&pageSize=25`: pages count from 1. */
export const pageQuerySchema = z.object({
  page: z.coerce.number().int().min(1).max(100_000).default(1),
  pageSize: z.coerce.number().int().min(1).max(PAGE_SIZE_MAX).default(50),
});

/** Which page is asked for. */
export type PageQuery = z.infer<typeof pageQuerySchema>;

/** A page of `item`s and how many there are in all. */
export const pageOf = <T extends z.ZodType>(item: T) =>
  z.object({
    items: z.array(item),
    page: z.number().int(),
    pageSize: z.number().int(),
    total: z.number().int(),
  });

/** A page as every list route answers it. */
export interface Page<T> {
  items: T[];
  page: number;
  pageSize: number;
  total: number;
}
