/** Two-line elements, as they are pasted. */
import { lengthCaps } from '../../core/index';
import { FieldTrouble } from '../parts/numberField';
import { useApp } from '../state/appContext';
import { typeTwoLine } from '../state/entryActions';

export function TwoLineField() {
  const { document, store } = useApp();
  const { draft, entered } = document;
  const text = draft.value.entry.texts.twoLine;
  const error = entered.value.ok ? undefined : entered.value.errors.twoLine;
  const setText = (text: string) => typeTwoLine(document, text);
  return (
    <div class={`field field-tall${error ? ' has-error' : ''}`}>
      <label class="field-label" for="two-line">
        Two-line elements
      </label>
      <textarea
        id="two-line"
        class="two-line"
        rows={3}
        spellcheck={false}
        autocomplete="off"
        autocapitalize="off"
        wrap="off"
        maxLength={lengthCaps.text}
        aria-invalid={error ? true : undefined}
        aria-describedby="two-line-says"
        placeholder="Paste both lines; a name line may stand above."
        readOnly={store.tabs.editorElsewhere.value}
        value={text}
        onInput={(event) => setText(event.currentTarget.value)}
      />
      <div id="two-line-says" aria-live="polite">
        {error && <FieldTrouble error={error} onText={setText} />}
      </div>
    </div>
  );
}
