import type { MouseEvent } from "react";

/**
 * Lets the first of several quick taps through and drops the others: the page may have changed under the thumb,
 * and the second tap of a double tap was not meant for what is there now.
 */
export function takeFirstTap<E extends MouseEvent>(
  handle: ((event: E) => void) | undefined,
): (event: E) => void {
  return (event) => {
    if (event.detail <= 1) handle?.(event);
  };
}
