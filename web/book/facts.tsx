import { enteredAs } from './fieldLabels';
import type { ListedEntry } from './listing';
import { orbitFigures } from './orbitSummary';
import { savedWhen } from './savedWhen';
import { useBook } from './useBook';

type Readable = Extract<ListedEntry['content'], { kind: 'readable' }>;

/** What the saved revision says: its orbit in figures, then where it comes from. */
export function Facts({ entry, content }: { readonly entry: ListedEntry; readonly content: Readable }) {
  const { candidate, summary } = content;
  return (
    <>
      <Figures summary={summary} />
      <dl class="book-facts">
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
            {entry.demo && ', demo book'}
          </dd>
        </div>
      </dl>
    </>
  );
}

function Figures({ summary }: Pick<Readable, 'summary'>) {
  const { app } = useBook();
  if (summary.kind === 'unsettled') return <p class="book-caution">No orbit yet. {summary.message}</p>;
  return (
    <dl class="book-figures">
      {orbitFigures(summary, app.preferences.values.value.lengthUnit).map(({ label, number, unit }) => (
        <div key={label}>
          <dt>{label}</dt>
          <dd>
            {number}
            <span class="book-unit">{unit}</span>
          </dd>
        </div>
      ))}
    </dl>
  );
}
