import type { Coordinates } from '../angles/place.ts';
import type { Parsed } from '../survey/problem.ts';
import { parseGridReference } from './grid-reference.ts';

/** An angle as typed: degrees, and minutes and seconds where given; the letter of its hemisphere, or none. */
interface TypedAngle {
  parts: [degrees: number, minutes: number, seconds: number];
  given: [boolean, boolean, boolean];
  negative: boolean;
  letter?: string;
}

const MARKS = ['°', "'", '"'];
const TOKEN = /\s*(?:([-+]?\d+(?:\.\d+)?)\s*(°|'|")?|([NSEW])|[,;/|()])/gy;

/**
 * Reads a place as people write it: decimal degrees, degrees and minutes, degrees, minutes and seconds, with colons between them too; signs or the
 * letters N S E W before or after; decimal points or commas; a `geo:` address or a link that holds a pair; a place on the
 * UTM grid, by metres or by lettered square. Without letters the latitude comes first. Degrees, north and east positive,
 * rounded to 1e-7 (a centimetre); warnings where a grid reference is coarse or lies outside its zone.
 */
export function parseCoordinates(text: string): Parsed<Coordinates> {
  const plain = plainText(text);
  if (plain === '') return refused('Type or paste the coordinates, such as 44.91, -72.20.');
  const onGrid = parseGridReference(text);
  if (onGrid) return onGrid;
  const linked = pairOfLink(plain);
  if (linked) return checked(linked.map((value) => angleOf(value)) as [TypedAngle, TypedAngle]);
  const angles = anglesOf(pointed(plain));
  return typeof angles === 'string' ? refused(angles) : checked(angles);
}

const refused = (message: string): Parsed<never> => ({ ok: false, problems: [{ path: '', message }] });

/** One sort of each sign, letters for the words of direction, and no labels. */
function plainText(text: string): string {
  return (
    text
      // Before the letters are made alike, which turns this sign into a letter o.
      .replace(/[º˚]/g, '°')
      .normalize('NFKC')
      .trim()
      .replace(/[−–—]/g, '-')
      .replace(/''|′′|’’|[″”“]/g, '"')
      .replace(/[′’‘`´]/g, "'")
      .replace(/\b(north|south|east|west)\b/gi, (word) => word[0].toUpperCase())
  );
}

/** Two decimal numbers side by side in an address. */
function pairOfLink(text: string): [number, number] | null {
  if (!/^[a-z][a-z0-9+.-]*:/i.test(text) || /^lat/i.test(text)) return null;
  const match = /(-?\d{1,3}(?:\.\d+)?)(?:,|%2C|\/)\s*(-?\d{1,3}\.\d+)/i.exec(text);
  return match ? [Number(match[1]), Number(match[2])] : null;
}

/** Decimal commas to points: where there is no point, and a comma between digits more than once. */
function pointed(text: string): string {
  const commas = text.match(/\d,\d/g)?.length ?? 0;
  return text.includes('.') || commas < 2 ? text : text.replace(/(\d),(\d)/g, '$1.$2');
}

function angleOf(value: number): TypedAngle {
  return { parts: [Math.abs(value), 0, 0], given: [true, false, false], negative: value < 0 };
}

/** The two angles of a text, or what is wrong with it. */
function anglesOf(text: string): [TypedAngle, TypedAngle] | string {
  const bare = text
    .replace(/\b(lat|lon|lng|long|latitude|longitude)\b\.?\s*[:=]?/gi, ' ')
    .replace(/(?<=\d):(?=\d)/g, ' ')
    .toUpperCase();
  const numbers: { text: string; mark?: string }[] = [];
  const letters: { letter: string; after: number }[] = [];
  TOKEN.lastIndex = 0;
  let read = 0;
  for (let match = TOKEN.exec(bare); match; match = TOKEN.exec(bare)) {
    read = TOKEN.lastIndex;
    if (match[1] !== undefined) numbers.push({ text: match[1], mark: match[2] });
    else if (match[3] !== undefined) letters.push({ letter: match[3], after: numbers.length });
  }
  const rest = bare.slice(read).trim();
  if (rest !== '')
    return `“${rest.slice(0, 20)}” is not understood there. Write the place as 44.91, -72.20 or 44° 54' 36" N, 72° 12' W.`;
  const cut = cutOf(numbers.length, letters);
  if (typeof cut === 'string') return cut;
  const first = angle(numbers.slice(0, cut), letters[0]?.letter);
  if (typeof first === 'string') return first;
  const second = angle(numbers.slice(cut), letters[1]?.letter);
  return typeof second === 'string' ? second : [first, second];
}

/** How many of the numbers belong to the first angle. */
function cutOf(count: number, letters: readonly { letter: string; after: number }[]): number | string {
  if (count < 2) return 'Two angles are needed, latitude and longitude.';
  if (count > 6) return 'There are more numbers than two angles have. Paste the coordinates alone.';
  if (letters.length === 0)
    return count % 2 === 0
      ? count / 2
      : 'Two angles are needed, each with as many numbers. Put N or S and E or W after them.';
  if (letters.length !== 2)
    return 'Put N or S after the latitude and E or W after the longitude, or no letter at all.';
  const [one, other] = letters;
  const before = one.after === 0;
  const cut = before ? other.after : one.after;
  const inPlace = before ? cut > 0 && cut < count : cut > 0 && cut < count && other.after === count;
  return inPlace ? cut : 'Put each letter before or after its own angle.';
}

function angle(numbers: readonly { text: string; mark?: string }[], letter?: string): TypedAngle | string {
  const typed: TypedAngle = { parts: [0, 0, 0], given: [false, false, false], negative: false, letter };
  let next = 0;
  for (const [place, { text, mark }] of numbers.entries()) {
    const unit = mark === undefined ? next : MARKS.indexOf(mark);
    if (unit > 2 || unit < next) return 'Degrees come first, then minutes, then seconds.';
    if (/^[-+]/.test(text) && place > 0) return 'Only the degrees can have a sign.';
    if (text.startsWith('-')) typed.negative = true;
    typed.parts[unit] = Math.abs(Number(text));
    typed.given[unit] = true;
    next = unit + 1;
  }
  return faultOf(typed) ?? typed;
}

function faultOf({ parts: [degrees, minutes, seconds], given, negative, letter }: TypedAngle): string | null {
  if (!given[0]) return 'The degrees are missing.';
  if (minutes >= 60 || seconds >= 60) return 'Minutes and seconds go up to 59.';
  const broken = (given[1] && !Number.isInteger(degrees)) || (given[2] && !Number.isInteger(minutes));
  if (broken) return 'Only the last number of an angle can have decimals.';
  return negative && letter ? 'Give a sign or a letter, not both.' : null;
}

const valueOf = ({ parts: [degrees, minutes, seconds], negative, letter }: TypedAngle): number => {
  const size = Math.round((degrees + minutes / 60 + seconds / 3600) * 1e7) / 1e7;
  return negative || letter === 'S' || letter === 'W' ? -size || 0 : size;
};

/** Latitude and longitude told apart by their letters, else by their order; both in range. */
function checked([first, second]: [TypedAngle, TypedAngle]): Parsed<Coordinates> {
  const isEastWest = ({ letter }: TypedAngle) => letter === 'E' || letter === 'W';
  if (first.letter && isEastWest(first) === isEastWest(second))
    return refused('One angle needs N or S, the other E or W.');
  const [northward, eastward] = first.letter && isEastWest(first) ? [second, first] : [first, second];
  const latitude = valueOf(northward);
  const longitude = valueOf(eastward);
  if (Math.abs(latitude) > 90) {
    const swapped = !first.letter && Math.abs(longitude) <= 90;
    const remedy = swapped ? 'The latitude comes first: change the two round.' : 'Check the number.';
    return refused(`A latitude goes from -90 to 90; this is ${latitude}. ${remedy}`);
  }
  if (Math.abs(longitude) > 180)
    return refused(`A longitude goes from -180 to 180; this is ${longitude}. Check the number.`);
  return { ok: true, value: { latitude, longitude }, warnings: [] };
}
