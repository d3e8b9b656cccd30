/** The picture side of Size: one drawing at a time, each fetched when it is first looked at. */
import type { FunctionComponent } from 'preact';
import type { Notice, ResolvedOrbit } from '../../core/index';
import { Choice } from '../parts/choice';
import { later } from '../parts/later';
import { useApp } from '../state/appContext';
import { type PictureId, pictureIds } from '../state/picture';
import './pictures.css';

const views: Readonly<Record<PictureId, FunctionComponent<{ readonly orbit: ResolvedOrbit }>>> = {
  map: later(async () => (await import('./map/mapPicture')).MapPicture),
  chart: later(async () => (await import('./chart/chartView')).ChartView),
  orbit: later(async () => (await import('./orbit/orbitView')).OrbitView),
  sweep: later(async () => (await import('./sweep/sweepView')).SweepView),
  tracks: later(async () => (await import('./tracks/tracksPicture')).TracksPicture),
};
const names: Readonly<Record<PictureId, string>> = {
  chart: 'Rates',
  orbit: 'Orbit',
  tracks: 'Tracks',
  map: 'Map',
  sweep: 'Sweep',
};

export function Pictures() {
  const { document, picture } = useApp();
  const orbit = document.orbit.value;
  if (!orbit) return null;
  const View = views[picture.value];
  return (
    <div class={document.stale.value ? 'pictures is-stale' : 'pictures'}>
      <Notices notices={document.notices.value} severity="caution" />
      {pictureIds.length > 1 && (
        <Choice
          label="Picture"
          name="picture"
          options={pictureIds.map((id) => ({ value: id, label: names[id] }))}
          value={picture.value}
          onChoose={(id) => {
            picture.value = id;
          }}
        />
      )}
      <View orbit={orbit} />
      <Notices notices={document.notices.value} severity="note" />
    </div>
  );
}

interface NoticesProps {
  readonly notices: readonly Notice[];
  readonly severity: Notice['severity'];
}

/** Cautions stand above the picture, notes below it. */
function Notices({ notices, severity }: NoticesProps) {
  const shown = notices.filter((notice) => notice.severity === severity);
  if (shown.length === 0) return null;
  return (
    <ul class="notices">
      {shown.map(({ id, text }) => (
        <li key={id} class={`notice is-${severity}`}>
          {text}
        </li>
      ))}
    </ul>
  );
}
