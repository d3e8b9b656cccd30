/** What a revision changed, field by field, in words. */
import { type Candidate, type FieldId, fieldIds, type OrbitEntry, storedLimitText } from '../../core/index';
import { bodyLabels, fieldLabels, fieldsInUse, formLabels, frameLabels, nodeLabels } from './fieldLabels';

const arrow = (label: string, before: string, after: string): string[] =>
  before === after ? [] : [`${label} ${before || 'empty'} → ${after || 'empty'}`];

/** Such as `['Inclination 97.6 → 97.68']`; empty where nothing differs. Texts are given as typed. */
export function changesBetween(before: Candidate, after: Candidate): string[] {
  return [
    ...(before.name === after.name ? [] : [`Name “${before.name}” → “${after.name}”`]),
    ...arrow('Body', bodyLabels[before.body], bodyLabels[after.body]),
    ...arrow('Gravity set', before.gravitySet, after.gravitySet),
    ...tagChanges(before.entry, after.entry),
    ...textChanges(before, after),
    ...notesChange(before.notes, after.notes),
    ...roomChange('Conditions', before.conditions, after.conditions),
    ...limitChanges(before.limits, after.limits),
    ...roomChange('Plans', before.plans, after.plans),
  ];
}

function tagChanges(before: OrbitEntry, after: OrbitEntry): string[] {
  return [
    ...arrow('Entered as', formLabels[before.form], formLabels[after.form]),
    ...arrow('Elements are', before.elementsAre, after.elementsAre),
    ...arrow('Node given as', nodeLabels[before.nodeForm], nodeLabels[after.nodeForm]),
    ...arrow('Local time by the', `${before.sun} Sun`, `${after.sun} Sun`),
    ...arrow('Frame', frameLabels[before.frame], frameLabels[after.frame]),
    ...arrow('Unit of lengths', before.lengthUnit, after.lengthUnit),
    ...arrow('Unit of the state vector', before.stateUnit, after.stateUnit),
  ];
}

function textChanges(before: Candidate, after: Candidate): string[] {
  const differing = fieldIds.filter((id) => before.entry.texts[id] !== after.entry.texts[id]);
  const inUse = new Set(fieldsInUse(after));
  const shown = differing.filter((id) => inUse.has(id));
  const others = differing.length - shown.length;
  return [
    ...shown.flatMap((id) => textChange(id, before.entry.texts[id], after.entry.texts[id])),
    ...(others > 0 ? [`${others} ${others === 1 ? 'field' : 'fields'} of other forms`] : []),
  ];
}

function textChange(id: FieldId, before: string, after: string): string[] {
  // Two lines of digits side by side tell nobody anything.
  if (id === 'twoLine' && before && after) return ['Two-line elements replaced'];
  return arrow(
    fieldLabels[id],
    id === 'twoLine' && before ? 'given' : before,
    id === 'twoLine' && after ? 'given' : after,
  );
}

function notesChange(before: string, after: string): string[] {
  if (before === after) return [];
  if (!before) return ['Notes added'];
  return [after ? 'Notes rewritten' : 'Notes taken out'];
}

/** Limits that went and came; one that was changed did both. */
function limitChanges(before: Candidate['limits'], after: Candidate['limits']): string[] {
  const texts = (limits: Candidate['limits']) => limits.map(storedLimitText);
  const [old, now] = [texts(before), texts(after)];
  const gone = old.filter((text) => !now.includes(text)).map((text) => `Limit taken out: ${text}`);
  const come = now.filter((text) => !old.includes(text)).map((text) => `Limit set: ${text}`);
  const said = [...gone, ...come];
  return said.length > 0 ? said : roomChange('Limits', before, after);
}

const roomChange = (label: string, before: unknown, after: unknown): string[] =>
  JSON.stringify(before) === JSON.stringify(after) ? [] : [`${label} changed`];
