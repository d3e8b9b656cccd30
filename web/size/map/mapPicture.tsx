/** The ground track on the map of the Earth, and for every body the days on which the equator is crossed. */
import { useSignal } from '@preact/signals';
import { useMemo } from 'preact/hooks';
import { type Cycle, periods, type ResolvedOrbit, trackPattern, trackStepOf } from '../../../core/index';
import { useApp } from '../../state/appContext';
import { tracksModelOf } from '../tracks/tracksModel';
import { useTakeTrack } from '../tracks/useTaking';
import { CrossingStrip } from './crossingStrip';
import { type CycleAtHand, cycleAtHand } from './cycleAtHand';
import './map.css';
import { type Legs, MapControls } from './mapControls';
import { mapAnswer, mapText } from './mapWords';
import { type DrawnSpan, type TrackDrawn, trackDrawn } from './trackDrawn';
import { WorldMap } from './worldMap';

export function MapPicture({ orbit }: { readonly orbit: ResolvedOrbit }) {
  const { document } = useApp();
  const { draft, stale } = document;
  const isStale = stale.value;
  const { conditions } = draft.value;
  const atHand = useMemo(() => cycleAtHand(orbit, { conditions }, isStale), [orbit, conditions, isStale]);
  if (!atHand.ok) {
    return (
      <p class="map-none" role="status">
        {atHand.message}
      </p>
    );
  }
  return <TrackPictures orbit={orbit} atHand={atHand} />;
}

interface PicturesProps {
  readonly orbit: ResolvedOrbit;
  readonly atHand: CycleAtHand;
}

function TrackPictures({ orbit, atHand }: PicturesProps) {
  // A cycle that nobody holds, and a long one, is only the nearest by arithmetic: its first day tells more.
  const span = useSignal<DrawnSpan>(atHand.nearest && atHand.cycle.days > 5 ? 'day' : 'cycle');
  const legs = useSignal<Legs>('both');
  const shading = useSignal<'none' | 'swath'>('none');
  const model = tracksModelOf(useApp(), orbit);
  const unit = useApp().preferences.values.value.lengthUnit;
  const { filter } = model.wishes.value;
  const { cycle } = atHand;
  const track = useTrack(orbit, cycle, span.value);
  const tracksStep = trackStepOf(orbit.body, orbit.mean, 'second') ?? 'west';
  const pattern = useMemo(() => trackPattern(cycle, tracksStep), [cycle.revolutions, cycle.days, tracksStep]);
  if (!track.ok) return <p class="map-none">{track.message}</p>;
  const hasMap = orbit.body.id === 'earth';
  const swathKm = filter?.swathKm ?? null;
  const firstNodeRad = track.isPlaced ? track.firstNodeRad : null;
  return (
    <div class="map">
      <p class="map-sentence" role="status">
        {mapAnswer({ atHand, track, props: { orbit, pattern }, unit }).map(({ text, strong }, index) =>
          // Always the same shape: the parts have no other name than their place.
          strong ? <strong key={`${index}${text}`}>{text}</strong> : text,
        )}
      </p>
      <TakeNearest atHand={atHand} />
      <MapControls {...{ span, legs, shading, model, cycle, hasMap }} />
      {hasMap && (
        <EarthFigure
          orbit={orbit}
          track={track}
          legs={legs.value}
          swathKm={shading.value === 'swath' ? swathKm : null}
        />
      )}
      <figure>
        <figcaption>
          <span class="figure-title">Day on which the equator is crossed northward</span>
          <span class="soft small">
            one interval, {firstNodeRad === null ? 'east of the first pass' : 'east longitude'}
          </span>
        </figcaption>
        <CrossingStrip {...{ orbit, cycle, pattern, tracksStep, firstNodeRad, swathKm }} />
      </figure>
    </div>
  );
}

function useTrack(orbit: ResolvedOrbit, cycle: Cycle, span: DrawnSpan) {
  return useMemo(() => {
    const { nodalS, nodalDayS } = periods(orbit.body, orbit.mean, 'second');
    return trackDrawn({ orbit, cycle, span, revolutionsADay: (nodalDayS ?? Number.NaN) / nodalS });
  }, [orbit, cycle.revolutions, cycle.days, span]);
}

function TakeNearest({ atHand: { nearest } }: { readonly atHand: CycleAtHand }) {
  const { document } = useApp();
  const { blocked, take } = useTakeTrack();
  if (!nearest) return null;
  const isSunSynchronous = document.draft.value.conditions.some(({ kind }) => kind === 'sunSynchronous');
  return (
    <button type="button" class="map-take" disabled={blocked} onClick={() => take(nearest, isSunSynchronous)}>
      Hold {nearest.revolutions}/{nearest.days}
    </button>
  );
}

interface EarthProps {
  readonly orbit: ResolvedOrbit;
  readonly track: TrackDrawn;
  readonly legs: Legs;
  /** Null where none is drawn. */
  readonly swathKm: number | null;
}

function EarthFigure({ orbit, track, legs, swathKm }: EarthProps) {
  const radiusKm = orbit.body.equatorialRadiusKm;
  const style = useMemo(
    () => ({ legs, swathHalfRad: swathKm === null ? null : swathKm / 2 / radiusKm }),
    [legs, swathKm, radiusKm],
  );
  return (
    <figure>
      <figcaption>
        <span class="figure-title">Ground track</span>
        <span class="soft small">
          {track.isWhole ? 'one cycle' : `${Math.round(track.revolutions)} revolutions`}, northward solid, southward
          dashed
          {track.isPlaced ? '' : '; no epoch, so the first node is put on 0°'}
        </span>
      </figcaption>
      <WorldMap says={mapText(track, orbit.body.name)} hasLand track={track} style={style} />
      <p class="soft small map-legend">● start, ○ end, ■ northward crossing</p>
    </figure>
  );
}
