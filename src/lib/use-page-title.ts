import { useEffect } from 'react';

/** Names the browser tab after the page: `Revisions · Tide gateway · Millpond`. */
export function usePageTitle(...steps: (string | undefined)[]): void {
  const title = [...steps, 'Millpond'].filter(Boolean).join(' · ');
  useEffect(() => {
    document.title = title;
  }, [title]);
}
