import { useLayoutEffect, useState, type RefObject } from 'react';

/** Width of an element as laid out, before the first paint and whenever it changes; `usual` where nothing is laid out. */
export function useWidth(ref: RefObject<HTMLElement | null>, usual: number): number {
  const [width, setWidth] = useState(usual);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const measure = () => setWidth(Math.round(element.clientWidth) || usual);
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, [ref, usual]);
  return width;
}
