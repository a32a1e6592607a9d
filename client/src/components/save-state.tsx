import type { Saving } from '../lib/saving';
import { useFormat } from '../lib/use-format';

export type { Saving };

/** "Saved 14:02", "Saving", "Not saved: offline, kept here"; told to screen readers when it changes. */
export function SaveState({ saving }: { saving: Saving }) {
  const format = useFormat();
  return (
    <span
      className={saving.state === 'failed' || saving.state === 'stale' ? 'late small' : 'soft small'}
      role="status"
    >
      {saveWords(saving, format.time)}
    </span>
  );
}

export function saveWords(saving: Saving, time: (moment: string) => string): string {
  switch (saving.state) {
    case 'clean':
      return '';
    case 'typing':
      return 'Not saved yet';
    case 'saving':
      return 'Saving';
    case 'saved':
      return `Saved ${time(saving.at)}`;
    case 'failed':
      return saving.offline ? 'Not saved: offline, kept here' : 'Not saved, kept here';
    case 'stale':
      return 'Not saved: somebody else changed it';
  }
}
