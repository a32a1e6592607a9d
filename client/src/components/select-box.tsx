import type { ComponentProps } from 'react';

/** The browser's own list: it works on a phone, in a dialog and with every screen reader. */
export function SelectBox({ className, ...props }: ComponentProps<'select'>) {
  return <select {...props} className={`select-box ${className ?? ''}`} />;
}
