import type { FocusEvent, KeyboardEvent, PointerEvent } from 'react';
import { leftOutOf } from './left-out';
import { useWithoutStore } from './without-context';

function leftOutAt(target: EventTarget): ReturnType<typeof leftOutOf> {
  if (!(target instanceof Element)) return null;
  return leftOutOf(target.closest<HTMLElement>('[data-without]')?.dataset.without);
}

/**
 * Follows the mouse and the focus over everything that carries `data-without`. Touch does not point: it has a button
 * where the thing stands.
 */
export function usePointing() {
  const store = useWithoutStore();
  return {
    onPointerOver: (event: PointerEvent) => {
      if (event.pointerType !== 'touch') store.pointAt(leftOutAt(event.target));
    },
    onPointerLeave: (event: PointerEvent) => {
      if (event.pointerType !== 'touch') store.pointAt(null);
    },
    onFocus: (event: FocusEvent) => {
      store.pointAt(leftOutAt(event.target));
    },
    onBlur: (event: FocusEvent) => {
      if (event.relatedTarget === null) store.pointAt(null);
    },
    onKeyDownCapture: (event: KeyboardEvent) => {
      if (event.key !== 'Escape' || !store.end()) return;
      event.preventDefault();
      event.stopPropagation();
    },
  };
}
