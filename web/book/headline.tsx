import { useSignalEffect } from '@preact/signals';
import { useRef } from 'preact/hooks';
import { headlineParts } from './sentences';
import { useBook } from './useBook';

/** How many orbits there are, and which one is in the editor. Takes the focus when no row is left to take it. */
export function Headline() {
  const { app, view } = useBook();
  const heading = useRef<HTMLHeadingElement>(null);
  useSignalEffect(() => {
    if (view.focusOn.value !== 'headline') return;
    heading.current?.focus();
    view.focusOn.value = null;
  });
  const { stored, problem } = view;
  if (problem.value !== null) return <h1 class="headline">The book cannot be read now. {problem.value}</h1>;
  if (stored.value === null) return <h1 class="headline">Reading the book …</h1>;
  const { document } = app;
  const { id, name } = document.draft.value;
  const inBook = stored.value.some((entry) => entry.id === id);
  const parts = headlineParts(stored.value.length, { name, inBook, changed: document.changed.value });
  return (
    <h1 class="headline" ref={heading} tabIndex={-1}>
      {parts.count}
      <strong>{parts.name}</strong>
      {parts.state}
    </h1>
  );
}
