/** One field of an entry: label, text, unit, steppers and, below, what is wrong with it in words. */
import type { ComponentChildren } from 'preact';
import { useId } from 'preact/hooks';
import { type FieldError, lengthCaps } from '../../core/index';
import { signTurned } from './stepping';
import { useDragSteps } from './useDragSteps';
import { useRepeat } from './useRepeat';

export interface NumberFieldProps {
  readonly label: string;
  /** Stands in place of the label text where the label is itself a choice. */
  readonly labelControl?: ComponentChildren;
  readonly text: string;
  readonly unit?: string;
  readonly error?: FieldError | undefined;
  readonly note?: string | undefined;
  /** The note warns: it is set apart from a hint. */
  readonly noteIsCaution?: boolean;
  /** The text some steps on, or null where the text cannot be stepped. */
  readonly step?: ((text: string, count: number) => string | null) | undefined;
  readonly signed?: boolean;
  readonly keyboard?: 'decimal' | 'text';
  readonly placeholder?: string;
  readonly readOnly?: boolean;
  /** A condition settles the value: it is shown, and cannot be typed. */
  readonly isSettled?: boolean;
  readonly onText: (text: string) => void;
  /** In place of `onText` where stepping moves more than this field. */
  readonly onStep?: ((text: string) => void) | undefined;
}

export function NumberField({ isSettled = false, ...given }: NumberFieldProps) {
  const id = useId();
  const props = isSettled ? { ...given, readOnly: true, step: undefined } : given;
  const { error, note } = props;
  return (
    <div class={`field${error ? ' has-error' : ''}${isSettled ? ' is-settled' : ''}`}>
      <div class="field-row">
        <FieldLabel id={id} {...props} />
        <FieldInput id={id} {...props} />
        {props.signed && !isSettled && <SignButton {...props} />}
        {props.step && <Steppers {...props} />}
        {isSettled && <span class="field-settled">settled by condition</span>}
      </div>
      <div id={`${id}-says`} aria-live="polite">
        {error && <FieldTrouble error={error} onText={props.onText} />}
        {!error && note && <p class={props.noteIsCaution ? 'field-note is-caution' : 'field-note'}>{note}</p>}
      </div>
    </div>
  );
}

type PartProps = NumberFieldProps & { readonly id: string };

function FieldLabel({ id, label, labelControl, text, step, onText, onStep, readOnly }: PartProps) {
  const drag = useDragSteps((count) => {
    const next = readOnly ? null : step?.(text, count);
    if (next !== null && next !== undefined) (onStep ?? onText)(next);
  });
  if (labelControl) return <div class="field-label">{labelControl}</div>;
  return (
    <label for={id} class={`field-label${step ? ' can-drag' : ''}`} {...(step ? drag : {})}>
      {label}
    </label>
  );
}

/** A longer number is written smaller: none of its digits may be out of sight. */
function sizeClass({ length }: string): string {
  if (length > 14) return ' is-longer is-longest';
  if (length > 11) return ' is-longer';
  return length > 7 ? ' is-long' : '';
}

function FieldInput({
  id,
  label,
  labelControl,
  text,
  unit,
  error,
  step,
  keyboard,
  placeholder,
  readOnly,
  onText,
  onStep,
}: PartProps) {
  const onKeyDown = (event: KeyboardEvent) => {
    const direction = { ArrowUp: 1, ArrowDown: -1 }[event.key];
    if (direction === undefined || !step || readOnly) return;
    event.preventDefault();
    const next = step(text, event.shiftKey ? direction * 10 : direction);
    if (next !== null) (onStep ?? onText)(next);
  };
  return (
    <span class="field-value">
      <input
        id={id}
        class={`field-input${keyboard === 'text' ? '' : sizeClass(text)}`}
        inputMode={keyboard ?? 'decimal'}
        autocomplete="off"
        autocapitalize="off"
        maxLength={lengthCaps.text}
        spellcheck={false}
        enterkeyhint="done"
        aria-label={labelControl ? label : undefined}
        aria-invalid={error ? true : undefined}
        aria-describedby={`${id}-says`}
        placeholder={placeholder}
        readOnly={readOnly}
        value={text}
        onInput={(event) => onText(event.currentTarget.value)}
        onKeyDown={onKeyDown}
      />
      {unit && <span class="field-unit">{unit}</span>}
    </span>
  );
}

function SignButton({ label, text, readOnly, onText }: NumberFieldProps) {
  return (
    <button
      type="button"
      class="field-button sign"
      disabled={readOnly}
      aria-label={`Turn the sign of ${label}`}
      // The field keeps the focus, so that the keypad stays.
      onMouseDown={(event) => event.preventDefault()}
      onClick={() => onText(signTurned(text))}
    >
      ±
    </button>
  );
}

function Steppers({ label, text, step, readOnly, onText, onStep }: NumberFieldProps) {
  const stepBy = (count: number) => () => {
    const next = step?.(text, count);
    if (next !== null && next !== undefined) (onStep ?? onText)(next);
  };
  const down = useRepeat(stepBy(-1));
  const up = useRepeat(stepBy(1));
  return (
    <>
      <button type="button" class="field-button" disabled={readOnly} aria-label={`Less ${label}`} {...down}>
        −
      </button>
      <button type="button" class="field-button" disabled={readOnly} aria-label={`More ${label}`} {...up}>
        +
      </button>
    </>
  );
}

export function FieldTrouble({
  error,
  onText,
}: {
  readonly error: FieldError;
  readonly onText: (text: string) => void;
}) {
  return (
    <div class="field-error">
      <p>{error.message}</p>
      {error.choices?.map((choice) => (
        <button key={choice.text} type="button" onClick={() => onText(choice.text)}>
          {choice.label}
        </button>
      ))}
    </div>
  );
}
