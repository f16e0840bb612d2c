import type { ComponentType } from 'preact';
import { useEffect, useState } from 'preact/hooks';
import { useApp } from '../app-context.ts';

type Loaded<P> = { load: unknown; screen: ComponentType<P> };

/** A screen that is loaded when it is first asked for; one that does not load is told in the trouble bar. */
export function LazyScreen<P extends object>({
  load,
  with: props,
}: {
  load: () => Promise<ComponentType<P>>;
  with: P;
}) {
  const { state } = useApp();
  const [loaded, setLoaded] = useState<Loaded<P> | null>(null);
  useEffect(() => {
    let wanted = true;
    load().then(
      (screen) => wanted && setLoaded({ load, screen }),
      (cause: unknown) => (state.trouble.value = { code: 'part-missing', detail: String(cause) }),
    );
    return () => {
      wanted = false;
    };
  }, [load, state]);
  if (loaded?.load !== load) return null;
  const Screen = loaded.screen;
  return <Screen {...props} />;
}
