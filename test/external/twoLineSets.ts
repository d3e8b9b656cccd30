/**
 * Invented two-line sets: seeded, so the same on every machine, with valid checksums.
 *
 * Written by its own code, not by the parser under test, from the column layout of Spacetrack
 * Report no. 3. Objects, numbers and epochs are made up.
 */

export interface TwoLineSet {
  readonly line1: string;
  readonly line2: string;
  readonly family: OrbitFamily['name'];
  readonly inclinationDeg: number;
  readonly eccentricity: number;
  readonly revolutionsPerDay: number;
}

interface OrbitFamily {
  readonly name: 'low' | 'sunSynchronous' | 'medium' | 'geosynchronous' | 'transfer' | 'halfDay';
  readonly perigeeAltitudeKm: readonly [number, number];
  readonly eccentricity: readonly [number, number];
  readonly inclinationDeg: readonly [number, number];
}

const families: readonly OrbitFamily[] = [
  { name: 'low', perigeeAltitudeKm: [300, 1500], eccentricity: [0, 0.03], inclinationDeg: [2, 178] },
  { name: 'sunSynchronous', perigeeAltitudeKm: [450, 900], eccentricity: [0, 0.003], inclinationDeg: [97, 99.5] },
  { name: 'medium', perigeeAltitudeKm: [5000, 20000], eccentricity: [0, 0.2], inclinationDeg: [2, 140] },
  { name: 'geosynchronous', perigeeAltitudeKm: [35000, 36000], eccentricity: [0, 0.01], inclinationDeg: [0.01, 15] },
  { name: 'transfer', perigeeAltitudeKm: [250, 900], eccentricity: [0.1, 0.7], inclinationDeg: [2, 120] },
  { name: 'halfDay', perigeeAltitudeKm: [600, 1500], eccentricity: [0.68, 0.7], inclinationDeg: [61, 65] },
];

/** `count` sets, the families in turn. */
export function twoLineSets(count: number, seed = 20_270_321): readonly TwoLineSet[] {
  const random = mulberry32(seed);
  return Array.from({ length: count }, (_, index) => {
    const family = families[index % families.length];
    if (!family) throw new Error('expected a family of orbits');
    return makeSet(family, index, random);
  });
}

function makeSet(family: OrbitFamily, index: number, random: () => number): TwoLineSet {
  const between = ([least, greatest]: readonly [number, number]) => least + (greatest - least) * random();
  const eccentricity = Number(between(family.eccentricity).toFixed(7));
  const inclinationDeg = Number(between(family.inclinationDeg).toFixed(4));
  const semiMajorAxisKm = (6378.135 + between(family.perigeeAltitudeKm)) / (1 - eccentricity);
  const revolutionsPerDay = (Math.sqrt(398600.8 / semiMajorAxisKm ** 3) * 86400) / (2 * Math.PI);
  const number = catalogText(index % 3 === 0 ? 100_000 + ((index * 577) % 240_000) : 70_000 + index);
  const year = String(Math.floor(random() * 100)).padStart(2, '0');
  const day = (1 + random() * 364).toFixed(8).padStart(12, '0');
  const drag = `${random() < 0.2 ? '-' : ' '}${String(Math.floor(10_000 + random() * 89_999))}-${3 + (index % 4)}`;
  const slope = `${random() < 0.2 ? '-' : ' '}.${String(Math.floor(random() * 99_999)).padStart(8, '0')}`;
  const angle = () => (random() * 359.9999).toFixed(4).padStart(8);
  const one = `1 ${number}U 27001A   ${year}${day} ${slope}  00000-0 ${drag} 0 ${String(index % 1000).padStart(4)}`;
  const two = [
    `2 ${number} ${inclinationDeg.toFixed(4).padStart(8)} ${angle()}`,
    `${eccentricity.toFixed(7).slice(2)} ${angle()} ${angle()}`,
    revolutionsPerDay.toFixed(8).padStart(11) + String(index * 37).padStart(5),
  ].join(' ');
  return {
    line1: withChecksum(one),
    line2: withChecksum(two),
    family: family.name,
    inclinationDeg,
    eccentricity,
    revolutionsPerDay,
  };
}

/** Five characters; numbers from 100 000 begin with a letter, I and O left out. */
export function catalogText(number: number): string {
  if (number < 100_000) return String(number).padStart(5, '0');
  const letter = 'ABCDEFGHJKLMNPQRSTUVWXYZ'.charAt(Math.floor(number / 10_000) - 10);
  return letter + String(number % 10_000).padStart(4, '0');
}

/** Appends the checksum to 68 columns: digits add themselves, a minus adds one. */
export function withChecksum(line: string): string {
  if (line.length !== 68) throw new Error(`expected 68 columns, got ${line.length}: ${line}`);
  const sum = [...line].reduce((total, c) => total + (/\d/.test(c) ? Number(c) : c === '-' ? 1 : 0), 0);
  return `${line}${sum % 10}`;
}

/** Public-domain generator of 32-bit state, good enough to spread test cases. */
function mulberry32(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}
