import type { KeyboardEvent, MouseEvent, PointerEvent } from 'react';

/**
 * Handlers of a button that shows something while it is held, by pointer or by Space or Enter. A press that holds
 * nothing, as assistive technology makes it, shows, and the next one hides.
 */
export function holdHandlers(isShown: boolean, show: (isShown: boolean) => void) {
  const isHoldKey = ({ key }: KeyboardEvent): boolean => key === ' ' || key === 'Enter';
  return {
    onPointerDown: ({ button }: PointerEvent) => button === 0 && show(true),
    onPointerUp: () => show(false),
    onPointerLeave: () => show(false),
    onPointerCancel: () => show(false),
    onBlur: () => show(false),
    onKeyDown: (event: KeyboardEvent) => {
      if (!isHoldKey(event)) return;
      // Otherwise the browser would press the button as well.
      event.preventDefault();
      if (!event.repeat) show(true);
    },
    onKeyUp: (event: KeyboardEvent) => {
      if (!isHoldKey(event)) return;
      event.preventDefault();
      show(false);
    },
    onClick: ({ detail }: MouseEvent) => detail === 0 && show(!isShown),
  };
}
