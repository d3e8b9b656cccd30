import { enteredAs } from './fieldLabels';
import type { ListedEntry } from './listing';
import { orbitLine } from './orbitSummary';
import { savedWhen } from './savedWhen';
import { useBook } from './useBook';

type Readable = Extract<ListedEntry['content'], { kind: 'readable' }>;

/** What the saved revision says, in rows. */
export function Facts({ entry, content }: { readonly entry: ListedEntry; readonly content: Readable }) {
  const { app } = useBook();
  const { candidate, summary } = content;
  const { lengthUnit } = app.preferences.values.value;
  return (
    <dl class="book-facts">
      <div>
        <dt>Perigee × apogee, inclination</dt>
        <dd>
          {orbitLine(summary, lengthUnit)}
          {summary.kind === 'unsettled' && <span class="book-caution small book-block">{summary.message}</span>}
        </dd>
      </div>
      {summary.kind === 'orbit' && (
        <div>
          <dt>Fingerprint</dt>
          <dd class="book-letters">{summary.fingerprint}</dd>
        </div>
      )}
      <div>
        <dt>Entered as</dt>
        <dd>{enteredAs(candidate)}</dd>
      </div>
      <div>
        <dt>Saved</dt>
        <dd>
          {entry.saved ? `revision ${entry.saved.revision}, ${savedWhen(entry.saved.atIso, new Date())}` : 'not yet'}
          {entry.demo && ' (demo book)'}
        </dd>
      </div>
    </dl>
  );
}
