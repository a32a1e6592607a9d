import type { Differential } from '@weighhouse/shared/contracts/differential';

/** A contributor as this viewer may know them. The referrer gets no names: the server says what stands in their place. */
export interface Voice {
  key: string;
  name: string;
  specialty: string | null;
  weight: number | null;
  you: boolean;
}

/** Everybody whose numbers are on the screen, oneself first. */
export function voicesOf(differential: Differential): Voice[] {
  const others = (differential.others ?? []).map(({ key, name, specialty, weight }) => ({
    key,
    name,
    specialty,
    weight,
    you: false,
  }));
  const { mine } = differential;
  return mine
    ? [{ key: mine.key, name: 'You', specialty: null, weight: null, you: true }, ...others]
    : others;
}

export function voiceName(differential: Differential, key: string): string {
  return voicesOf(differential).find((voice) => voice.key === key)?.name ?? 'A contributor';
}
