import { useCallback, useState } from 'react';

/** Whether what lies in the element of `ref` is wider than the element. */
export function useOverflows() {
  const [overflows, setOverflows] = useState(false);
  const ref = useCallback((element: HTMLElement | null) => {
    if (!element || typeof ResizeObserver === 'undefined') return undefined;
    const measure = () => setOverflows(element.scrollWidth > element.clientWidth + 1);
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    for (const child of element.children) observer.observe(child);
    return () => observer.disconnect();
  }, []);
  return { ref, overflows };
}
