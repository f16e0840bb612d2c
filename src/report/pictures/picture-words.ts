export const MONTH_NAMES = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;

/** What a picture writes, in one language. */
export interface PictureWords {
  /** January to December, short. */
  months: readonly string[];
  /** The same in a letter, where there is no room for more. */
  initials: readonly string[];
  /** Letters of the eight compass points, from north clockwise. */
  compass: readonly string[];
  /** Over sky that nobody looked at. */
  unseen: string;
  /** Of an obstruction that is imagined away, or lower. */
  gone: (name: string) => string;
  lower: (name: string) => string;
  number: (value: number) => string;
  /** Of the day, 0 to 24. */
  hour: (hour: number) => string;
}

export const ENGLISH: PictureWords = {
  months: MONTH_NAMES.map((name) => name.slice(0, 3)),
  initials: MONTH_NAMES.map((name) => name[0]),
  compass: ['N', 'NE', 'E', 'SE', 'S', 'SW', 'W', 'NW'],
  unseen: 'nobody looked here',
  gone: (name) => `${name}, gone`,
  lower: (name) => `${name}, lower`,
  number: String,
  hour: String,
};
