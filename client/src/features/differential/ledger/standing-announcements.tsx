import { useEffect, useRef, useState } from 'react';
import { StandingAnnouncer } from '../model/announcement';
import { useLedger } from './ledger-context';

/** Says a live change of the standing to screen readers, politely and at most once in five seconds. */
export function StandingAnnouncements() {
  const { differential, columns } = useLedger();
  const standing = differential.assessment?.standing;
  const announcer = useRef(new StandingAnnouncer());
  const [said, setSaid] = useState('');
  useEffect(() => {
    if (!standing) return;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const hear = () => {
      const heard = announcer.current.hear(standing, columns, Date.now());
      if (heard && 'say' in heard) setSaid(`${heard.say}.`);
      else if (heard) timer = setTimeout(hear, heard.wait);
    };
    // Not during the drawing: what is said follows what is seen.
    timer = setTimeout(hear, 0);
    return () => {
      clearTimeout(timer);
    };
  }, [standing, columns]);
  return (
    <p className="aside-text" role="status">
      {said}
    </p>
  );
}
