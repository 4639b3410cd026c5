import { useSyncExternalStore } from 'react';

function onConnection(listener: () => void): () => void {
  window.addEventListener('online', listener);
  window.addEventListener('offline', listener);
  return () => {
    window.removeEventListener('online', listener);
    window.removeEventListener('offline', listener);
  };
}

/** A line across the page while this device has no connection. */
export function OfflineNotice() {
  const online = useSyncExternalStore(onConnection, () => navigator.onLine);
  return (
    <div role="status">
      {online ? null : (
        <p className="border-b border-line bg-copper-soft px-4 py-2 text-sm sm:px-8">
          <strong>Offline.</strong> What is shown may be older than what the server holds, and nothing can be saved
          until the connection is back. Keep this page open.
        </p>
      )}
    </div>
  );
}
