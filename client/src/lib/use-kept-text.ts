import { useState } from 'react';
import { forget, keep, kept } from './kept';

/** Text of a form that is sent as a whole; it survives a closed tab until `clear`. */
export function useKeptText(key: string): [string, (text: string) => void, () => void] {
  const [text, setText] = useState(() => {
    const left = kept(key);
    return typeof left === 'string' ? left : '';
  });
  const change = (next: string) => {
    setText(next);
    if (next === '') forget(key);
    else keep(key, next);
  };
  return [
    text,
    change,
    () => {
      change('');
    },
  ];
}
