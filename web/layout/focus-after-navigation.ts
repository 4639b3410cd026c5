import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

/** After a change of page the focus goes to the new content, unless something that is still there holds it. */
export function useFocusAfterNavigation(): void {
  const { pathname } = useLocation();
  const before = useRef(pathname);
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    if (document.activeElement === null || document.activeElement === document.body) {
      document.getElementById('content')?.focus({ preventScroll: true });
    }
  }, [pathname]);
}
