/** The frame around the places: rail, head, banners and the message at the lower edge. */
import type { FunctionComponent } from 'preact';
import { Banners } from './parts/banners';
import { Head } from './parts/head';
import { PlaceIcon } from './parts/icons';
import { later } from './parts/later';
import { ShellNotice } from './parts/shellNotice';
import { SizePlace } from './size/sizePlace';
import { useApp } from './state/appContext';
import { hashOf, type Place, places } from './state/route';

/** Size is there at once; the others follow when they are asked for, from the cache. */
const views: Readonly<Record<Place, FunctionComponent>> = {
  size: SizePlace,
  drift: later(async () => (await import('./drift/driftPlace')).DriftPlace),
  book: later(async () => (await import('./book/bookPlace')).BookPlace),
};
const titles: Readonly<Record<Place, string>> = { size: 'Size', drift: 'Drift', book: 'Book' };

export function App() {
  const { route } = useApp();
  const place = route.place.value;
  const View = views[place];
  return (
    <div class="shell">
      <nav class="rail" aria-label="Places">
        {places.map((each) => (
          <a key={each} href={hashOf(each)} aria-current={each === place ? 'page' : undefined}>
            <PlaceIcon place={each} />
            {titles[each]}
          </a>
        ))}
      </nav>
      <header class="head-area">
        <Head />
        <Banners />
      </header>
      <main class={`place place-${place}`} key={place}>
        <View />
      </main>
      <ShellNotice />
    </div>
  );
}
