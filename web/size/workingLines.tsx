/** The lines of a working, each as formula and then with its numbers; what was put in, and the constants. */
import type { ComponentChildren } from 'preact';
import {
  formatSignificant,
  type Working,
  type WorkingLine,
  type WorkingSymbol,
  type WorkingValue,
  workingDigits,
} from '../../core/index';
import { FormulaMath } from '../parts/formulaMath';
import { useScrollFocus } from '../parts/useScrollFocus';

const unitText = (unit: string): string => unit.replace(/^deg(?=\/|$)/, '°');

function valueText({ symbol, value }: WorkingValue): string {
  const unit = unitText(symbol.unit);
  const number = formatSignificant(value * symbol.perCore, workingDigits);
  if (unit === '') return number;
  return unit === '°' ? `${number}°` : `${number} ${unit}`;
}

function Glyph({ symbol }: { readonly symbol: WorkingSymbol }) {
  if (symbol.sub === undefined) return <mi>{symbol.glyph}</mi>;
  return (
    <msub>
      <mi>{symbol.glyph}</mi>
      <mi>{symbol.sub}</mi>
    </msub>
  );
}

export function WorkingTables({ working }: { readonly working: Working }) {
  if (working.inputs.length + working.constants.length === 0) return null;
  return (
    <table class="working-table">
      <caption>Put in</caption>
      <tbody>
        {[...working.inputs, ...working.constants].map((row) => (
          <InputRow key={row.symbol.id} row={row} />
        ))}
      </tbody>
      <tfoot>
        <tr>
          <td colSpan={2} class="working-source">
            {[...new Set(working.constants.map(({ source }) => source))].join(' ')}
          </td>
        </tr>
      </tfoot>
    </table>
  );
}

function InputRow({ row }: { readonly row: WorkingValue }) {
  return (
    <tr>
      <th scope="row">
        <math>
          <Glyph symbol={row.symbol} />
        </math>{' '}
        <span class="soft">{row.symbol.name}</span>
      </th>
      <td>{valueText(row)}</td>
    </tr>
  );
}

interface LinesProps {
  readonly title: string;
  readonly lines: readonly WorkingLine[];
  readonly working: Working;
}

export function WorkingLines({ title, lines, working }: LinesProps) {
  if (lines.length === 0) return null;
  const known = new Map(
    [...working.inputs, ...working.constants, ...lines].map((each) => [each.symbol.id, each] as const),
  );
  return (
    <section class="working-lines">
      <h3>{title}</h3>
      <ol>
        {lines.map((line) => (
          <Line key={line.symbol.id} line={line} known={known} isResult={line.symbol.id === working.result} />
        ))}
      </ol>
    </section>
  );
}

interface LineProps {
  readonly line: WorkingLine;
  readonly known: ReadonlyMap<string, WorkingValue>;
  readonly isResult: boolean;
}

function Line({ line, known, isResult }: LineProps) {
  const find = (id: string): WorkingValue => {
    const found = known.get(id);
    if (!found) throw new Error(`The working of ${line.symbol.id} expected a value for ${id}, got none`);
    return found;
  };
  return (
    <li class={isResult ? 'is-result' : ''}>
      <span class="working-name">{line.symbol.name}</span>
      <Formula>
        <Glyph symbol={line.symbol} />
        <mo>=</mo>
        <FormulaMath tree={line.expr} symbolOf={(id) => <Glyph symbol={find(id).symbol} />} />
      </Formula>
      <Formula>
        <mo>=</mo>
        <FormulaMath tree={line.expr} symbolOf={(id) => <NumberPutIn value={find(id)} />} />
      </Formula>
      <p class="working-value">= {valueText(line)}</p>
    </li>
  );
}

/** A formula longer than its line scrolls in itself. */
function Formula({ children }: { readonly children: ComponentChildren }) {
  return (
    <p class="formula" ref={useScrollFocus<HTMLParagraphElement>('x')}>
      <math displaystyle>{children}</math>
    </p>
  );
}

function NumberPutIn({ value }: { readonly value: WorkingValue }) {
  const { symbol } = value;
  const number = formatSignificant(value.value * symbol.perCore, workingDigits);
  const text = symbol.unit === 'deg' ? `${number}°` : number;
  return /[−×]/.test(text) ? (
    <mrow>
      <mo>(</mo>
      <mn>{text}</mn>
      <mo>)</mo>
    </mrow>
  ) : (
    <mn>{text}</mn>
  );
}
