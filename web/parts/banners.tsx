/** What concerns every place: storage that is refused, an editor in another tab, a new version that waits. */
import type { ComponentChildren } from 'preact';
import { useApp } from '../state/appContext';

export function Banners() {
  const { store, offline } = useApp();
  return (
    <>
      {store.trouble && <Banner>{store.trouble.message}</Banner>}
      {store.state.value === 'superseded' && (
        <Banner>A newer Driftbook was opened in another tab. Load this tab again to go on saving.</Banner>
      )}
      {store.tabs.editorElsewhere.value && (
        <Banner>
          <span>This book is being edited in another tab.</span>
          <button type="button" onClick={() => void store.tabs.takeOver()}>
            Edit here instead
          </button>
        </Banner>
      )}
      {offline.updateWaiting.value && <UpdateBanner />}
    </>
  );
}

function UpdateBanner() {
  const { offline, announcer } = useApp();
  const apply = async () => {
    const applied = await offline.applyUpdate();
    if (!applied) {
      announcer.say({ tone: 'caution', text: 'Your draft could not be kept, so the new version waits. Save first.' });
    }
  };
  return (
    <Banner>
      <span>A new version is ready. It waits until you ask for it; your draft stays.</span>
      <button type="button" onClick={() => void apply()}>
        Load the new version
      </button>
    </Banner>
  );
}

function Banner({ children }: { readonly children: ComponentChildren }) {
  return (
    <div class="banner" role="alert">
      {children}
    </div>
  );
}
