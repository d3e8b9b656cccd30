import { beforeEach, describe, expect, it } from 'vitest';
import { bookOn, candidateNamed, freshDatabase, shelves, valueIn } from './support';

const namesOf = (entries: readonly { readonly name: string }[]) => entries.map(({ name }) => name);

describe.each(Object.entries(shelves))('the book %s', (_where, { open, reopen }) => {
  beforeEach(freshDatabase);

  it('has a saved candidate after the process was killed', async () => {
    const saved = await bookOn(await open()).save(candidateNamed('Coast'), { note: 'first', basedOn: null });
    expect(saved).toMatchObject({ ok: true, entry: { revision: 1, name: 'Coast', demo: false } });
    const [entry] = valueIn(await bookOn(await reopen()).list());
    expect(entry).toMatchObject({ kind: 'readable', id: 'one', revision: 1, candidate: candidateNamed('Coast') });
  });

  it('brings the kept draft up to what was saved, which a killed process would else open an older one over', async () => {
    const shelf = await open();
    await shelf.change((rows) =>
      rows.putDraft('current', {
        candidate: candidateNamed('Coa'),
        baseRevision: null,
        typedAtIso: '2028-01-01T00:00:00Z',
      }),
    );
    await bookOn(shelf).save(candidateNamed('Coast'), { note: '', basedOn: null });
    const draft = valueIn(await (await reopen()).look((rows) => rows.draft('current')));
    expect(draft).toMatchObject({ candidate: { name: 'Coast' }, baseRevision: 1 });
  });

  it('keeps every revision with its note, latest first', async () => {
    const book = bookOn(await open());
    await book.save(candidateNamed('Coast'), { note: 'first', basedOn: null });
    await book.save(candidateNamed('Coast, higher'), { note: 'higher', basedOn: 1 });
    const revisions = valueIn(await bookOn(await reopen()).revisionsOf('one'));
    expect(revisions.map(({ revision, note }) => [revision, note])).toEqual([
      [2, 'higher'],
      [1, 'first'],
    ]);
    expect(revisions[1]).toMatchObject({ kind: 'readable', candidate: { name: 'Coast' } });
  });

  it('restores an old revision as a new one and keeps those between', async () => {
    const book = bookOn(await open());
    await book.save(candidateNamed('Coast'), { note: 'first', basedOn: null });
    await book.save(candidateNamed('Coast, higher'), { note: 'higher', basedOn: 1 });
    const restored = await book.restore('one', 1);
    expect(restored).toMatchObject({ ok: true, entry: { revision: 3, candidate: { name: 'Coast' } } });
    expect(valueIn(await book.revisionsOf('one'))).toHaveLength(3);
  });

  it('says so when the revision to restore does not exist', async () => {
    const book = bookOn(await open());
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    expect(await book.restore('one', 7)).toMatchObject({ ok: false, reason: 'missing' });
  });

  it('refuses to write over a revision that the editor has not seen', async () => {
    const book = bookOn(await open());
    const elsewhere = bookOn(await reopen());
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    await elsewhere.save(candidateNamed('Coast, theirs'), { note: '', basedOn: 1 });
    const answer = await book.save(candidateNamed('Coast, mine'), { note: '', basedOn: 1 });
    expect(answer).toMatchObject({ ok: false, reason: 'conflict', stored: { revision: 2, name: 'Coast, theirs' } });
    expect(namesOf(valueIn(await book.list()))).toEqual(['Coast, theirs']);
  });

  it('saves on top of the other revision on request, and both stay', async () => {
    const book = bookOn(await open());
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    await book.save(candidateNamed('Coast, theirs'), { note: '', basedOn: 1 });
    const answer = await book.save(candidateNamed('Coast, mine'), { note: '', basedOn: 1, evenIfNewer: true });
    expect(answer).toMatchObject({ ok: true, entry: { revision: 3 } });
    const revisions = valueIn(await book.revisionsOf('one'));
    expect(revisions.map((row) => row.kind === 'readable' && row.candidate.name)).toEqual([
      'Coast, mine',
      'Coast, theirs',
      'Coast',
    ]);
  });

  it('takes two saves of a new candidate at the same moment for a conflict, not a replacement', async () => {
    const book = bookOn(await open());
    const answers = await Promise.all([
      book.save(candidateNamed('Coast'), { note: '', basedOn: null }),
      book.save(candidateNamed('Coast again'), { note: '', basedOn: null }),
    ]);
    expect(answers.map(({ ok }) => ok)).toEqual([true, false]);
  });

  it('brings a removed candidate back after a restart, with its history', async () => {
    const book = bookOn(await open());
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    await book.remove('one');
    const later = bookOn(await reopen());
    expect(valueIn(await later.list())).toEqual([]);
    expect(namesOf(valueIn(await later.list({ removed: true })))).toEqual(['Coast']);
    await later.undoRemove('one');
    expect(namesOf(valueIn(await later.list()))).toEqual(['Coast']);
    expect(valueIn(await later.revisionsOf('one'))).toHaveLength(1);
  });

  it('drops for good only what was removed before the given moment', async () => {
    const book = bookOn(await open());
    for (const id of ['one', 'two', 'three']) await book.save(candidateNamed(id, id), { note: '', basedOn: null });
    const removed = valueIn(await book.remove('one'));
    await book.remove('two');
    const justAfter = new Date(Date.parse(removed.deletedAtIso ?? '') + 1);
    expect(valueIn(await book.purgeRemoved(justAfter))).toBe(1);
    expect(valueIn(await book.revisionsOf('one'))).toEqual([]);
    expect(namesOf(valueIn(await book.list({ removed: true })))).toEqual(['two']);
    expect(namesOf(valueIn(await book.list()))).toEqual(['three']);
  });

  it('renames in a revision of its own', async () => {
    const book = bookOn(await open());
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    const renamed = await book.rename('one', 'Shore');
    expect(renamed).toMatchObject({ ok: true, entry: { revision: 2, name: 'Shore', candidate: { name: 'Shore' } } });
  });

  it('duplicates under a new identifier, starting a history of its own', async () => {
    const book = bookOn(await open());
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    await book.save(candidateNamed('Coast'), { note: '', basedOn: 1 });
    const copy = await book.duplicate('one');
    expect(copy).toMatchObject({ ok: true, entry: { id: 'new-1', revision: 1, name: 'Coast, copy' } });
    expect(valueIn(await book.revisionsOf('new-1'))).toHaveLength(1);
  });

  it('lists the latest save first', async () => {
    const book = bookOn(await open());
    for (const id of ['one', 'two']) await book.save(candidateNamed(id, id), { note: '', basedOn: null });
    await book.rename('one', 'one, again');
    expect(namesOf(valueIn(await book.list()))).toEqual(['one, again', 'two']);
  });

  it('keeps an unreadable record and lists it with the reason', async () => {
    const shelf = await open();
    const book = bookOn(shelf);
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    const damaged = { schema: 99, id: 'two', later: 'something new' };
    const facts = { id: 'two', name: 'From the future', revision: 4, createdAtIso: '2030', savedAtIso: '2030' };
    valueIn(await shelf.change((rows) => rows.putCandidate({ ...facts, candidate: damaged })));
    const [entry] = valueIn(await book.list());
    expect(entry).toMatchObject({ kind: 'unreadable', name: 'From the future', revision: 4 });
    expect(entry?.kind === 'unreadable' && entry.message).toMatch(/newer/);
    expect(await book.rename('two', 'Mine')).toMatchObject({ ok: false, reason: 'unreadable' });
    expect(valueIn(await shelf.look((rows) => rows.candidate('two')))?.candidate).toEqual(damaged);
  });

  it('refuses to save what it could not read back', async () => {
    const book = bookOn(await open());
    const answer = await book.save({ ...candidateNamed('Coast'), id: '' }, { note: '', basedOn: null });
    expect(answer).toMatchObject({ ok: false, reason: 'unreadable' });
    expect(valueIn(await book.list())).toEqual([]);
  });

  it('counts changes for those who show the list, and leaves the count alone when refused', async () => {
    const book = bookOn(await open());
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    await book.save(candidateNamed('Coast'), { note: '', basedOn: null });
    expect(book.changes.value).toBe(1);
  });
});
