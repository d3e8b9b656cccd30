/** A part of the page that is fetched when it is first shown. Offline it comes from the cache. */
import type { FunctionComponent, VNode } from 'preact';
import { useEffect, useState } from 'preact/hooks';

type Loaded<Props> = { readonly part: FunctionComponent<Props> } | { readonly failed: true } | null;

export function later<Props extends object>(load: () => Promise<FunctionComponent<Props>>) {
  let known: Loaded<Props> = null;
  return function Later(props: Props): VNode {
    const [loaded, setLoaded] = useState(known);
    useEffect(() => {
      if (known) return;
      load().then(
        (part) => {
          known = { part };
          setLoaded(known);
        },
        // Not kept: the next visit tries again.
        () => setLoaded({ failed: true }),
      );
    }, []);
    if (!loaded) return <p class="later" role="status" aria-label="Opening" />;
    if ('failed' in loaded) {
      return (
        <p class="later">This part could not be loaded. Load Driftbook again, with a network if it is not cached.</p>
      );
    }
    const Part = loaded.part;
    return <Part {...props} />;
  };
}
