import { useEffect } from 'react';

/** Names the page in the browser's tab, with the product's name behind. */
export function useDocumentTitle(title: string | undefined): void {
  useEffect(() => {
    document.title = title ? `${title} · Counterpoise` : 'Counterpoise';
  }, [title]);
}
