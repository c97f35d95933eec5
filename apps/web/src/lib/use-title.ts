import { useEffect } from "react";

/** Puts the name of the screen in front of the product's in the title of the page. */
export function useTitle(title: string): void {
  useEffect(() => {
    document.title = `${title} - Emberladder`;
  }, [title]);
}
