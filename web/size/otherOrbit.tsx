/** Picks the saved candidate whose node rate this one is to share, so that their planes stay aligned. */
import { useEffect, useRef, useState } from 'preact/hooks';
import { type ConditionEntry, degPerRad, newCondition, secondsPerDay } from '../../core/index';
import { quantityText, usePreferredUnit } from '../parts/readingText';
import { useApp } from '../state/appContext';
import { type OtherOrbit, otherOrbits } from './otherOrbits';

export interface OtherOrbitProps {
  /** The conditions that are there already. */
  readonly present: readonly ConditionEntry[];
  readonly onClose: () => void;
}

export function OtherOrbitPicker({ present, onClose }: OtherOrbitProps) {
  const { document } = useApp();
  const title = useRef<HTMLHeadingElement>(null);
  useEffect(() => title.current?.focus(), []);
  const others = useOthers();
  const pick = ({ name, nodeRadPerS }: Extract<OtherOrbit, { kind: 'orbit' }>) => {
    // Nine decimals of a degree a day: a millimetre of the plane in a year.
    const rate = (nodeRadPerS * degPerRad * secondsPerDay).toFixed(9);
    document.conditions.add(newCondition('sameNodeRate', present, { rate, of: name }));
    onClose();
  };
  return (
    <section
      class="other-orbits"
      aria-labelledby="other-orbits-title"
      onKeyDown={(event) => event.key === 'Escape' && onClose()}
    >
      <div class="condition-head">
        <h3 id="other-orbits-title" class="condition-name" ref={title} tabIndex={-1}>
          Same node rate as
        </h3>
        <button type="button" onClick={onClose}>
          Cancel
        </button>
      </div>
      <OtherList others={others} onPick={pick} />
    </section>
  );
}

/** Null while the book is being read; a text where it could not be. */
function useOthers(): readonly OtherOrbit[] | string | null {
  const { document, store } = useApp();
  const entered = document.entered.value;
  const body = entered.ok ? entered.orbit.body : null;
  const { id } = document.draft.value;
  const [others, setOthers] = useState<readonly OtherOrbit[] | string | null>(null);
  useEffect(() => {
    let isShown = true;
    void store.book.list().then((list) => {
      if (!isShown) return;
      if (!list.ok) return setOthers(list.message);
      if (!body) return setOthers('The entry above does not come to an orbit yet.');
      const candidates = list.value.flatMap((entry) => (entry.kind === 'readable' ? [entry.candidate] : []));
      setOthers(
        otherOrbits(
          candidates.filter((candidate) => candidate.id !== id),
          body,
        ),
      );
    });
    return () => {
      isShown = false;
    };
  }, [store, body, id]);
  return others;
}

interface ListProps {
  readonly others: readonly OtherOrbit[] | string | null;
  readonly onPick: (other: Extract<OtherOrbit, { kind: 'orbit' }>) => void;
}

function OtherList({ others, onPick }: ListProps) {
  const unitId = usePreferredUnit()('angleRate');
  if (others === null) return <p class="soft small">Reading the book.</p>;
  if (typeof others === 'string') return <p class="condition-message">{others}</p>;
  if (others.length === 0) return <p class="soft small">No other saved candidate goes around this body.</p>;
  return (
    <ul class="solutions">
      {others.map((other) => {
        if (other.kind === 'noOrbit') {
          return (
            <li key={other.id} class="soft small">
              {other.name}: comes to no orbit yet.
            </li>
          );
        }
        const { value, unit } = quantityText('angleRate', other.nodeRadPerS, unitId);
        return (
          <li key={other.id}>
            <button type="button" class="other-orbit" onClick={() => onPick(other)}>
              <span>{other.name}</span>
              <span>
                {value} <span class="unit">{unit}</span>
              </span>
            </button>
          </li>
        );
      })}
    </ul>
  );
}
