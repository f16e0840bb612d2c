import type { PictureWords } from '../../pictures/picture-words.ts';
import type { Speech } from '../../speech.ts';

/** What the pictures of a report write, in its language. */
export function pictureWords(speech: Speech): PictureWords {
  const { words } = speech;
  const months = (style: 'short' | 'narrow') =>
    Array.from({ length: 12 }, (_, month) => speech.month(month, style).replace(/\.$/, ''));
  return {
    months: months('short'),
    initials: months('narrow'),
    compass: words['compass.letters'],
    unseen: words['picture.unseen'],
    gone: words['picture.gone'],
    lower: words['picture.lower'],
    number: (value) => speech.number(value, decimalsOf(value)),
    hour: (hour) => speech.hour(hour),
  };
}

/** Decimals a round number of an axis needs. */
function decimalsOf(value: number): number {
  const written = String(Number(value.toPrecision(6)));
  return written.includes('.') ? written.length - written.indexOf('.') - 1 : 0;
}
