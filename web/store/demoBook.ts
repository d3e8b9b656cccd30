/**
 * Puts the demo book in at the first start, and takes it out for good when asked.
 *
 * One setting says which of the two has happened. It is read and written in the same transaction as the
 * candidates, so that two tabs starting together, or a crash half way, cannot seed twice or bring it back.
 */
import type { Candidate } from '../../core/index';
import { writeRevision } from './bookChanges';
import type { Outcome, Shelf } from './rows';

const demoSetting = 'demoBook';

/** Whether the demo book was put in or taken out before; false too where the storage does not answer. */
export async function isDemoBookDecided(shelf: Shelf): Promise<boolean> {
  const setting = await shelf.look((rows) => rows.setting(demoSetting));
  return setting.ok && setting.value !== undefined;
}

/** Answers whether the candidates were put in by this call. */
export function seedDemoBook(
  shelf: Shelf,
  { candidates, savedAtIso }: { readonly candidates: readonly Candidate[]; readonly savedAtIso: string },
): Promise<Outcome<boolean>> {
  return shelf.change(async (rows) => {
    if ((await rows.setting(demoSetting)) !== undefined) return false;
    for (const candidate of candidates) {
      const current = await rows.candidate(candidate.id);
      if (current) continue;
      await writeRevision(rows, { candidate, note: 'Demo book', savedAtIso, current, basedOn: null, demo: true });
    }
    await rows.putSetting(demoSetting, 'seeded');
    return true;
  });
}

/** Drops the demo candidates that the user has not saved over; answers how many. The rest are the user's own. */
export function removeDemoBook(shelf: Shelf): Promise<Outcome<number>> {
  return shelf.change(async (rows) => {
    const demo = (await rows.candidates()).filter((row) => row.demo === true);
    await Promise.all(demo.map((row) => rows.dropCandidate(row.id)));
    await rows.putSetting(demoSetting, 'removed');
    return demo.length;
  });
}
