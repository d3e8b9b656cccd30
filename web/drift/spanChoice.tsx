/** The span of the plots: one of five, or any number of days up to 15 years. */
import { useState } from 'preact/hooks';
import { Choice } from '../parts/choice';
import { NumberField } from '../parts/numberField';
import { useApp } from '../state/appContext';
import { daysNumber, readSpan, type SpanId, spanIdOf, spans } from './spans';

export function SpanChoice() {
  const { preferences } = useApp();
  const { spanDays } = preferences.values.value;
  /** What is being typed; null while the field shows the span that is drawn. */
  const [typed, setTyped] = useState<string | null>(null);
  const choose = (id: SpanId) => {
    const span = spans.find((each) => each.id === id);
    setTyped(null);
    if (span) void preferences.set('spanDays', span.days);
  };
  const type = (text: string) => {
    const read = readSpan(text);
    setTyped(text);
    if (read.ok) void preferences.set('spanDays', read.days);
  };
  const read = typed === null ? null : readSpan(typed);
  return (
    <section class="drift-span" aria-label="Span">
      <Choice<SpanId>
        label="Span of the plots"
        name="drift-span"
        options={spans.map(({ id, label }) => ({ value: id, label }))}
        value={spanIdOf(spanDays)}
        onChoose={choose}
      />
      <div class="field-group">
        <NumberField
          label="Any span"
          unit="days"
          text={typed ?? daysNumber(spanDays)}
          error={read?.ok === false ? read.error : undefined}
          onText={type}
        />
      </div>
    </section>
  );
}
