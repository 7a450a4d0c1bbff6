import { Link, useSearchParams } from 'react-router-dom';

/** From page to page; the page is in the address beside whatever else is asked for. Nothing where one page holds all. */
export function Pagination({ page, pageSize, total }: { page: number; pageSize: number; total: number }) {
  const [search] = useSearchParams();
  const pages = Math.max(1, Math.ceil(total / pageSize));
  if (pages === 1 && page === 1) return null;
  const to = (target: number) => {
    const next = new URLSearchParams(search);
    next.set('page', String(target));
    return `?${next.toString()}`;
  };
  const step = 'inline-flex min-h-11 items-center font-semibold text-woad';
  return (
    <nav aria-label="Pages" className="mt-6 flex items-center gap-7 print:hidden">
      {page > 1 && (
        <Link to={to(Math.min(page - 1, pages))} rel="prev" className={step}>
          <span className="changeable leading-tight">Page before</span>
        </Link>
      )}
      <span className="text-ink-2" aria-current="page">
        Page {page} of {pages}
      </span>
      {page < pages && (
        <Link to={to(page + 1)} rel="next" className={step}>
          <span className="changeable leading-tight">Next page</span>
        </Link>
      )}
    </nav>
  );
}

/** The page and the search words that an address asks for; nonsense counts as the first page. */
export function readListAddress(url: string): { page: number; q: string } {
  const search = new URL(url, 'http://page.invalid').searchParams;
  const page = Number(search.get('page') ?? '1');
  return { page: Number.isInteger(page) && page >= 1 ? page : 1, q: (search.get('q') ?? '').trim() };
}
