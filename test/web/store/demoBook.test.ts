import { beforeEach, describe, expect, it } from 'vitest';
import { blankCandidate } from '../../../core/index';
import { removeDemoBook, seedDemoBook } from '../../../web/store/demoBook';
import { skerryBook } from '../../../web/store/skerryBook';
import { bookOn, freshDatabase, openShelf, valueIn } from './support';

const seed = { candidates: skerryBook, savedAtIso: '2028-01-01T00:00:00.000Z' };
const idsOf = (entries: readonly { readonly id: string }[]) => entries.map(({ id }) => id).sort();
const allIds = idsOf(skerryBook);

describe('the demo book', () => {
  beforeEach(freshDatabase);

  it('is there after the first start, with one revision each', async () => {
    const shelf = await openShelf();
    expect(valueIn(await seedDemoBook(shelf, seed))).toBe(true);
    const entries = valueIn(await bookOn(shelf).list());
    expect(idsOf(entries)).toEqual(allIds);
    expect(entries.every(({ kind, demo, revision }) => kind === 'readable' && demo && revision === 1)).toBe(true);
  });

  it('is put in once, even by two tabs starting together', async () => {
    const answers = await Promise.all([seedDemoBook(await openShelf(), seed), seedDemoBook(await openShelf(), seed)]);
    expect(answers.map(valueIn)).toEqual([true, false]);
    const revisions = valueIn(await bookOn(await openShelf()).revisionsOf('skerry-a'));
    expect(revisions).toHaveLength(1);
  });

  it('stays away for good once removed', async () => {
    const shelf = await openShelf();
    await seedDemoBook(shelf, seed);
    expect(valueIn(await removeDemoBook(shelf))).toBe(skerryBook.length);
    const afterRestart = await openShelf();
    expect(valueIn(await seedDemoBook(afterRestart, seed))).toBe(false);
    expect(valueIn(await bookOn(afterRestart).list())).toEqual([]);
    expect(valueIn(await bookOn(afterRestart).revisionsOf('skerry-a'))).toEqual([]);
  });

  it('leaves what the user has saved over, and what is the user’s own', async () => {
    const shelf = await openShelf();
    await seedDemoBook(shelf, seed);
    const book = bookOn(shelf);
    const [first] = skerryBook;
    if (!first) throw new Error('Expected a demo candidate, got none');
    await book.save({ ...first, notes: 'Mine now.' }, { note: '', basedOn: 1 });
    await book.save(blankCandidate({ id: 'own', name: 'Own' }), { note: '', basedOn: null });
    await removeDemoBook(shelf);
    expect(idsOf(valueIn(await book.list()))).toEqual(['own', first.id]);
  });

  it('takes removed demo candidates along, so that undo cannot bring one back', async () => {
    const shelf = await openShelf();
    await seedDemoBook(shelf, seed);
    const book = bookOn(shelf);
    await book.remove('skerry-b');
    await removeDemoBook(shelf);
    expect(await book.undoRemove('skerry-b')).toMatchObject({ ok: false, reason: 'missing' });
  });
});
