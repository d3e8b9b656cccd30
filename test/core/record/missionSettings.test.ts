import { describe, expect, it } from 'vitest';
import { changedPlans, type MissionChange, readMissionSettings } from '../../../core/index';

const settingsWith = (change: MissionChange) => readMissionSettings(changedPlans({}, change));

describe('the settings of a mission', () => {
  it('start with all zonals, Sun and Moon, no drag and a box of 15 minutes', () => {
    const { forces, boxMinutes, errors } = readMissionSettings({});
    expect(forces).toEqual({ zonalDegree: 14, sun: true, moon: true });
    expect(boxMinutes).toBe(15);
    expect(errors).toEqual({});
  });

  it('read what was typed, with a comma or a point', () => {
    const { forces } = settingsWith({ drag: true, texts: { massKg: '250,5', areaM2: '1.5', dragCoefficient: '2,3' } });
    expect(forces?.drag).toEqual({ massKg: 250.5, areaM2: 1.5, dragCoefficient: 2.3, density: 'mean' });
  });

  it('take a ballistic coefficient and a factor on the density', () => {
    const { forces } = settingsWith({
      drag: true,
      dragForm: 'ballistic',
      density: 'factor',
      texts: { ballisticKgPerM2: '60', densityFactor: '1.8' },
    });
    expect(forces?.drag).toEqual({ ballisticKgPerM2: 60, density: 1.8 });
  });

  it.each([
    ['zero', '0'],
    ['negative', '−3'],
    ['words', 'heavy'],
    ['empty', ''],
  ])('leave a message at a ballistic coefficient that is %s', (_, text) => {
    const settings = settingsWith({ drag: true, dragForm: 'ballistic', texts: { ballisticKgPerM2: text } });
    expect(settings.forces).toBeNull();
    expect(settings.errors.ballisticKgPerM2?.message).toMatch(/kg\/m²/);
  });

  it('warn of a ballistic coefficient that no satellite has, and take it', () => {
    const settings = settingsWith({ drag: true, dragForm: 'ballistic', texts: { ballisticKgPerM2: '0.002' } });
    expect(settings.forces?.drag).toEqual({ ballisticKgPerM2: 0.002, density: 'mean' });
    expect(settings.cautions.ballisticKgPerM2).toMatch(/0\.00200 kg\/m².*between 1 and 2000/);
  });

  it.each(['1', '15', '3.5', '-2', 'all'])('refuse %s as the highest zonal', (text) => {
    const settings = settingsWith({ texts: { zonalDegree: text } });
    expect(settings.forces).toBeNull();
    expect(settings.errors.zonalDegree?.message).toMatch(/2 to 14/);
  });

  it.each(['0', '-5', '721', ''])('refuse a box of “%s” minutes, and keep the forces', (text) => {
    const settings = settingsWith({ texts: { boxMinutes: text } });
    expect(settings.boxMinutes).toBeNull();
    expect(settings.forces).not.toBeNull();
  });

  it('look at drag only where it is on', () => {
    expect(settingsWith({ texts: { massKg: 'none' } }).errors).toEqual({});
  });

  it('keep keys that are not theirs, beside and inside', () => {
    const plans = { upkeep: { yearly: 2 }, drift: { later: [1], texts: { later: 'x', massKg: '9' } } };
    const changed = changedPlans(plans, { moon: false, texts: { areaM2: '4' } });
    expect(changed).toEqual({
      upkeep: { yearly: 2 },
      drift: { later: [1], moon: false, texts: { later: 'x', massKg: '9', areaM2: '4' } },
    });
    expect(plans.drift).toEqual({ later: [1], texts: { later: 'x', massKg: '9' } });
  });

  it.each([[null], ['text'], [[1, 2]], [{ texts: 7, sun: 'yes', density: 'thick' }]])(
    'start anew where %j is stored',
    (drift) => {
      expect(readMissionSettings({ drift }).forces).toEqual({ zonalDegree: 14, sun: true, moon: true });
    },
  );
});
