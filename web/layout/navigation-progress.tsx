import { useNavigation } from 'react-router-dom';

/** A line at the upper edge while the next page is on its way. */
export function NavigationProgress() {
  const { state } = useNavigation();
  return (
    <div role="status" className="fixed inset-x-0 top-0 z-50 h-0.5 print:hidden">
      {state === 'idle' ? null : (
        <div className="late h-full w-full bg-copper motion-safe:animate-pulse">
          <span className="sr-only">Loading the page …</span>
        </div>
      )}
    </div>
  );
}
