import { useEffect, useState } from 'react';
import { useWithout } from './without-context';

/** Milliseconds of rest before it is said: moving through the rows is not to be talked over. */
const rest = 500;

/** Says the standing without what somebody rests on, politely. */
export function WithoutStatus() {
  const sentence = useWithout()?.sentence ?? '';
  const [said, setSaid] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => {
      setSaid(sentence);
    }, rest);
    return () => {
      clearTimeout(timer);
    };
  }, [sentence]);
  return (
    <p className="aside-text" role="status">
      {said}
    </p>
  );
}
