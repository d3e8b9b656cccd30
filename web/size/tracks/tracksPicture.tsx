/** Which repeat tracks? The answer, the fields, the tracks nearest to the orbit, and the list, each a tap from being taken. */
import { effect } from '@preact/signals';
import { useEffect } from 'preact/hooks';
import type { ResolvedOrbit } from '../../../core/index';
import { useApp } from '../../state/appContext';
import { Nearest } from './nearest';
import { Progress } from './progress';
import { SearchFields } from './searchFields';
import { TrackTable } from './trackTable';
import './tracks.css';
import { type TracksModel, tracksModelOf } from './tracksModel';

export function TracksPicture({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const app = useApp();
  const model = tracksModelOf(app, orbit);
  useEffect(() => effect(() => wantAsTyped(model)), [model]);
  if (!orbit.body.rotationRadPerS) {
    return (
      <p class="tracks-none" role="status">
        {orbit.body.name} has no known day: type it below Body and units, and its repeat tracks are listed here.
      </p>
    );
  }
  return (
    <div class="tracks">
      <Answer model={model} />
      <SearchFields model={model} orbit={orbit} />
      <Progress model={model} />
      <List model={model} />
      <Nearest orbit={orbit} />
    </div>
  );
}

function wantAsTyped({ wishes, search }: TracksModel): void {
  const { request } = wishes.value;
  if (request) search.want(request);
}

function Answer({ model }: { readonly model: TracksModel }) {
  const listing = model.listing.value;
  const trouble = model.trouble.value;
  return (
    <div class="tracks-answer" role="status">
      {trouble && <p class="tracks-trouble">{trouble}</p>}
      {listing && !trouble && (
        <p class={`tracks-sentence${listing.staleBecause ? ' is-stale' : ''}`}>
          {listing.answer.map(({ text, strong }, index) =>
            // Always the same shape: the parts have no other name than their place.
            strong ? <strong key={`${index}${text}`}>{text}</strong> : text,
          )}
        </p>
      )}
    </div>
  );
}

function List({ model }: { readonly model: TracksModel }) {
  const listing = model.listing.value;
  if (!listing) return null;
  return (
    <>
      {listing.staleBecause && <p class="stale-says">{listing.staleBecause}</p>}
      <TrackTable model={model} listing={listing} />
    </>
  );
}
