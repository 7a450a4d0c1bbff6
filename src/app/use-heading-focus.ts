import { useEffect, useRef, type RefObject } from 'react';
import { useLocation } from 'react-router-dom';

/** After a navigation to another page the focus goes to its heading, as a new page would have it. */
export function useHeadingFocus(main: RefObject<HTMLElement | null>) {
  const { pathname } = useLocation();
  const before = useRef(pathname);
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    const heading = main.current?.querySelector<HTMLElement>('h1') ?? main.current;
    heading?.focus({ preventScroll: true });
  }, [pathname, main]);
}
