/** What the drawing is not, and what is to be heeded for this orbit. */
import { useApp } from '../state/appContext';
import type { DriftView } from './driftView';

export function DriftNotes({ view }: { readonly view: DriftView }) {
  const { document } = useApp();
  const notices = document.notices.value.filter(({ field }) => field === undefined);
  const hasLocalTime = view.drift.first.localTimeS !== null;
  return (
    <section class="drift-notes" aria-label="Notes">
      {notices.map(({ id, severity, text }) => (
        <p key={id} class={severity === 'caution' ? 'is-caution' : ''}>
          {text}
        </p>
      ))}
      <h2>What this drawing is not</h2>
      <p>
        A forecast. It holds the rates of now for the whole span. Sun, Moon, drag and the zonals above J4 change them
        and are not in it. First order is J2 alone; second order adds J2² and J4. Their difference is the error of the
        first order; what both leave out is not shown.
      </p>
      {hasLocalTime && <p>Local time counts against the mean Sun, and changes alike at both nodes.</p>}
      {!hasLocalTime && (
        <p>Local time is not drawn: the length of the year of {view.orbit.body.name} is not known here.</p>
      )}
    </section>
  );
}
