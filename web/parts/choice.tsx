/** A choice among a few: a row of segments, one of them taken. Arrow keys move, as in any radio group. */
export interface ChoiceOption<Value extends string> {
  readonly value: Value;
  readonly label: string;
}

export interface ChoiceProps<Value extends string> {
  readonly label: string;
  readonly name: string;
  readonly options: readonly ChoiceOption<Value>[];
  readonly value: Value;
  readonly onChoose: (value: Value) => void;
}

export function Choice<Value extends string>({ label, name, options, value, onChoose }: ChoiceProps<Value>) {
  return (
    <fieldset class="choice">
      <legend class="hidden-visually">{label}</legend>
      {options.map((option) => (
        <label key={option.value} class="choice-option">
          <input
            type="radio"
            name={name}
            value={option.value}
            checked={option.value === value}
            onChange={() => onChoose(option.value)}
          />
          <span>{option.label}</span>
        </label>
      ))}
    </fieldset>
  );
}
