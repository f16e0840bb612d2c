import { useEffect, useRef, useState } from 'preact/hooks';

function carriesFiles(event: DragEvent): boolean {
  return event.dataTransfer?.types.includes('Files') ?? false;
}

/** Takes files dropped anywhere on the page; true while some are held over it. */
export function useFileDrop(take: (files: File[]) => void): boolean {
  const [over, setOver] = useState(false);
  const latest = useRef(take);
  latest.current = take;
  useEffect(() => {
    const stop = new AbortController();
    const { signal } = stop;
    const hold = (event: DragEvent) => {
      if (!carriesFiles(event)) return;
      event.preventDefault();
      setOver(true);
    };
    const drop = (event: DragEvent) => {
      if (!carriesFiles(event)) return;
      event.preventDefault();
      setOver(false);
      latest.current([...(event.dataTransfer?.files ?? [])]);
    };
    addEventListener('dragover', hold, { signal });
    addEventListener('dragleave', (event) => event.relatedTarget === null && setOver(false), { signal });
    addEventListener('drop', drop, { signal });
    return () => stop.abort();
  }, []);
  return over;
}
