/**
 * The demo book: the invented coastal-ice watch "Skerry", one candidate for each way of entering an orbit.
 * No mission, person or organisation of this name is meant; all numbers are made up, and consistent.
 */
import { blankCandidate, type Candidate, type FieldId, fieldTexts, type OrbitEntry } from '../../core/index';

interface Sketch {
  readonly id: string;
  readonly name: string;
  readonly notes: string;
  readonly body?: Candidate['body'];
  readonly gravitySet?: Candidate['gravitySet'];
  readonly entry: Partial<Omit<OrbitEntry, 'texts'>>;
  readonly texts: Partial<Record<FieldId, string>>;
}

function candidateFrom({ id, name, notes, body = 'earth', gravitySet = 'EGM2008', entry, texts }: Sketch): Candidate {
  const blank = blankCandidate({ id, name });
  return { ...blank, notes, body, gravitySet, entry: { ...blank.entry, ...entry, texts: fieldTexts(texts) } };
}

const summerPass: Sketch = {
  id: 'skerry-a',
  name: 'Skerry A, summer pass',
  notes:
    'Colour pictures of the ice edge in summer, with the descending pass in mid-morning before the sea fog builds. The launcher gives 97.68° rather than the exact Sun-synchronous value, so watch how the local time moves.',
  entry: { form: 'altitudes', nodeForm: 'ltdn' },
  texts: {
    epoch: '2028-01-01T00:00:00Z',
    perigeeAltitude: '561',
    apogeeAltitude: '575',
    inclination: '97.68',
    node: '10:30',
    perigee: '90',
    meanAnomaly: '0',
  },
};

const winterPass: Sketch = {
  id: 'skerry-b',
  name: 'Skerry B, winter pass',
  notes:
    'Radar through the polar night, on the line between day and night so that the array sees the Sun nearly all year. Entered as mean elements, because that is what the trade study handed over.',
  entry: { form: 'elements', elementsAre: 'mean', nodeForm: 'ltan' },
  texts: {
    epoch: '2028-01-01T00:00:00Z',
    semiMajorAxis: '6946.137',
    eccentricity: '0.0011',
    inclination: '97.66',
    node: '18:00',
    perigee: '90',
    meanAnomaly: '0',
  },
};

const separationVector: Sketch = {
  id: 'skerry-c',
  name: 'Skerry C, separation vector',
  notes:
    'What the launch site would read out at separation: six numbers in metres, turning with the Earth. It aims at the same mid-morning pass as Skerry A and shows what such a vector says about the years after it.',
  entry: { form: 'state', frame: 'earthFixed', stateUnit: 'm' },
  texts: {
    epoch: '2028-03-14T06:20:35Z',
    x: '44577.8',
    y: '2012101.7',
    z: '6643568.0',
    vx: '3773.4282',
    vy: '6357.1564',
    vz: '-1944.8760',
  },
};

const buoyCollector: Sketch = {
  id: 'skerry-d',
  name: 'Skerry D, buoy collector',
  notes:
    'Collects the short messages of drifting ice buoys, from an orbit that passes over the coast at every hour in turn. Entered as the two lines that tracking would send.',
  gravitySet: 'WGS72',
  entry: { form: 'twoLine', frame: 'teme' },
  texts: {
    twoLine: [
      'SKERRY D',
      '1 99901U 28901A   28092.25000000  .00000214  00000-0  48210-4 0  9992',
      '2 99901  74.0124 118.4021 0011873  84.3107 275.9250 14.33512876003214',
    ].join('\n'),
  },
};

const relayEllipse: Sketch = {
  id: 'skerry-relay',
  name: 'Skerry relay ellipse',
  notes:
    'Hangs over the northern coast for eight hours of every twelve and passes the pictures on to the ground. Near the critical inclination its perigee stays in the south; see how well that has to be hit.',
  entry: { form: 'elements', elementsAre: 'mean', nodeForm: 'raan' },
  texts: {
    epoch: '2028-01-01T00:00:00Z',
    semiMajorAxis: '26562',
    eccentricity: '0.74',
    inclination: '63.4',
    node: '140',
    perigee: '270',
    meanAnomaly: '0',
  },
};

const altimeter: Sketch = {
  id: 'skerry-altimeter',
  name: 'Skerry altimeter',
  notes:
    'Measures the height of sea and ice to the centimetre, from an orbit high enough to leave the air behind. Its local time runs through the whole day, so that the tide is seen in all its phases.',
  entry: { form: 'altitudes', nodeForm: 'raan' },
  texts: {
    epoch: '2028-01-01T00:00:00Z',
    perigeeAltitude: '1335',
    apogeeAltitude: '1337',
    inclination: '66',
    node: '25',
    perigee: '90',
    meanAnomaly: '0',
  },
};

const marsFrost: Sketch = {
  id: 'skerry-mars',
  name: 'Skerry frost line, Mars',
  notes:
    'The same watch at another planet: the edge of the seasonal frost, at the same local time on every pass. Its node turns with the Sun in one Mars year.',
  body: 'mars',
  entry: { form: 'altitudes', nodeForm: 'raan' },
  texts: {
    epoch: '2028-02-20T00:00:00Z',
    perigeeAltitude: '395',
    apogeeAltitude: '405',
    inclination: '92.91',
    node: '60',
    perigee: '270',
    meanAnomaly: '0',
  },
};

export const skerryBook: readonly Candidate[] = [
  summerPass,
  winterPass,
  separationVector,
  buoyCollector,
  relayEllipse,
  altimeter,
  marsFrost,
].map(candidateFrom);
