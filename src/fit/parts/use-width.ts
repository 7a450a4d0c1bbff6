import { useLayoutEffect, useState, type RefObject } from 'react';
import { flushSync } from 'react-dom';

/** What a printed page holds across, in CSS px (A4 and US Letter less their margins). */
const PAPER_WIDTH = 690;

/** An element's width in px, followed as it changes; while printing, the paper's. */
export function useWidth(element: RefObject<HTMLElement | null>, first: number): number {
  const [width, setWidth] = useState(first);
  useLayoutEffect(() => {
    const node = element.current;
    if (!node) return;
    const read = () => setWidth(Math.floor(node.getBoundingClientRect().width));
    read();
    const observer = new ResizeObserver(read);
    observer.observe(node);
    // The drawing is laid out by script, so it must be laid out anew before the page is taken to the paper.
    const before = () => {
      observer.disconnect();
      flushSync(() => setWidth(PAPER_WIDTH));
    };
    const after = () => {
      read();
      observer.observe(node);
    };
    window.addEventListener('beforeprint', before);
    window.addEventListener('afterprint', after);
    return () => {
      observer.disconnect();
      window.removeEventListener('beforeprint', before);
      window.removeEventListener('afterprint', after);
    };
  }, [element]);
  return width;
}
