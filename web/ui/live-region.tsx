import { useEffect, useState } from 'react';
import { onAnnounce } from './announce.ts';

/** The one polite live region; `announce` speaks through it. */
export function LiveRegion() {
  const [text, setText] = useState('');
  useEffect(() => onAnnounce(setText), []);
  return (
    <div role="status" aria-live="polite" className="sr-only">
      {text}
    </div>
  );
}
