import { useEffect, useRef, useState, type RefObject } from 'react';

/**
 * The width of an element in whole CSS pixels, so that a drawing can be redrawn for it rather than
 * stretched. `fallback` holds until the first measurement (and where nothing can be measured).
 */
export function useWidth<E extends Element>(fallback: number): [RefObject<E | null>, number] {
  const ref = useRef<E>(null);
  const [width, setWidth] = useState(fallback);
  useEffect(() => {
    const element = ref.current;
    if (!element || typeof ResizeObserver === 'undefined') return;
    const measure = () => {
      const measured = Math.floor(element.getBoundingClientRect().width);
      if (measured > 0) setWidth(measured);
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
}
