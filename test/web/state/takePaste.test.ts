import { beforeAll, describe, expect, it } from 'vitest';
import { blankCandidate } from '../../../core/index';
import { createDocument, type OrbitDocument } from '../../../web/state/document';
import { stateReader, takePaste } from '../../../web/state/entryActions';
import { twoLineSets } from '../../external/twoLineSets';

const numbers = '6878137\n0\n0\n0\n7612.6\n10';

function pasted(text: string): { document: OrbitDocument; said: string | null } {
  const candidate = blankCandidate({ id: 'test' });
  const document = createDocument({ candidate, baseRevision: null, savedText: null });
  const outcome = takePaste(document, text);
  return { document, said: outcome === 'notOurs' ? null : outcome.said };
}
const entryOf = (text: string) => pasted(text).document.draft.value.entry;

beforeAll(() => stateReader.settled);

describe('a paste', () => {
  it('brings its axes, unit and epoch along', () => {
    const text = `Separation (ITRF), 14 Mar 2028 10:20:30 UTC\n${numbers}`;
    expect(entryOf(text)).toMatchObject({ form: 'state', frame: 'earthFixed', stateUnit: 'm' });
    expect(entryOf(text).texts).toMatchObject({ x: '6878137', vz: '10', epoch: '2028-03-14T10:20:30Z' });
    expect(pasted(text).said).toMatch(/Axes: Earth-fixed axes\. Check them/);
  });

  it('says where no axes are named', () => {
    expect(pasted(numbers).said).toMatch(/Axes not named: check them/);
  });

  it('finds two lines in a mail', () => {
    const [first] = twoLineSets(1);
    const set = `${first?.line1}\n${first?.line2}`;
    expect(entryOf(`Here it is\n\n${set}\n\nbye`)).toMatchObject({ form: 'twoLine', texts: { twoLine: set } });
  });

  it('that is a mail of numbers but no orbit changes nothing and says why', () => {
    const { document, said } = pasted(`Epoch 03/04/2028 10:20\n${numbers}`);
    expect(said).toMatch(/can be read as .* Nothing was changed\./);
    expect(document.changed.value).toBe(true);
    expect(document.draft.value.entry).toEqual(blankCandidate({ id: 'test' }).entry);
  });

  it('of one number or a few words is for the field', () => {
    expect(pasted('97.4').said).toBeNull();
    expect(pasted('2028-03-14T10:20:30.250000+02:00').said).toBeNull();
    expect(pasted('for the crew, about 3 of them, at noon').said).toBeNull();
  });
});
