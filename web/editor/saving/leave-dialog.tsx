import { useEffect, useState } from 'react';
import { useBlocker } from 'react-router-dom';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { useEditorStore } from '../editor-context.ts';
import { isDirty } from '../editor-store.ts';

/** Going to another page saves first; only where that fails it asks. */
export function LeaveDialog({ flush }: { flush: () => Promise<void> }) {
  const store = useEditorStore();
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) =>
      currentLocation.pathname !== nextLocation.pathname && isDirty(store.getState()),
  );
  /** Where the person was going when the save failed. */
  const [refused, setRefused] = useState<unknown>(null);

  useEffect(() => {
    if (blocker.state !== 'blocked') return;
    let left = false;
    void flush().then(() => {
      if (left) return;
      if (isDirty(store.getState())) setRefused(blocker.location);
      else blocker.proceed();
    });
    return () => {
      left = true;
    };
  }, [blocker, flush, store]);

  return (
    <Dialog
      title="Not everything is saved"
      open={blocker.state === 'blocked' && refused === blocker.location}
      onOpenChange={(open) => !open && blocker.reset?.()}
      footer={
        <>
          <Button onClick={() => blocker.proceed?.()}>Leave, keep it on this device</Button>
          <Button variant="primary" onClick={() => blocker.reset?.()}>
            Stay
          </Button>
        </>
      }
    >
      <p>
        The server has not taken the last changes. They are kept on this device and come back when you open this sketch
        again here.
      </p>
    </Dialog>
  );
}
