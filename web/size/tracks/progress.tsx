/** How far a search has come, and the button that ends it at once. */
import type { TracksModel } from './tracksModel';

export function Progress({ model }: { readonly model: TracksModel }) {
  const { search } = model;
  const running = search.running.value;
  const stopped = search.stopped.value;
  if (running?.isNoticed) {
    const percent = Math.round(running.share * 100);
    return (
      <div class="tracks-progress">
        <progress aria-label="Search for repeat tracks" value={percent} max={100} />
        <span class="soft small">
          cycles up to {running.request.maxDays} days, {percent} %
        </span>
        <button type="button" onClick={search.cancel}>
          Cancel
        </button>
      </div>
    );
  }
  if (!running && stopped) {
    return (
      <div class="tracks-progress">
        <span class="soft">{stopped.text}</span>
        <button type="button" onClick={search.again}>
          Search again
        </button>
      </div>
    );
  }
  return null;
}
