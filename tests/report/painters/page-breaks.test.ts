import { describe, expect, it } from 'vitest';
import { listSlugs } from '../../../src/report/painters/pdf/blocks/list-slugs.ts';
import { tableSlugs } from '../../../src/report/painters/pdf/blocks/table-slugs.ts';
import { paginate } from '../../../src/report/painters/pdf/paginate.ts';
import { settingFor } from '../../../src/report/painters/pdf/setting.ts';
import type { Slug } from '../../../src/report/painters/pdf/slug.ts';
import { Typesetter } from '../../../src/report/painters/pdf/typesetter.ts';
import { fontsOnDisk } from './pdf-fonts-on-disk.ts';

const setting = settingFor('a4', null, new Typesetter(fontsOnDisk(), undefined));

const tableOf = (rows: number) =>
  tableSlugs(
    {
      caption: 'Months',
      columns: [{ head: 'Month' }, { head: 'Share', number: true }],
      rows: Array.from({ length: rows }, (_, i) => [`Row ${i}`, `${i}%`]),
    },
    setting,
  );

/** How many of the slugs stand on each page, behind something as high as asked. */
function pagesBehind(height: number, slugs: readonly Slug[]): number[] {
  const before: Slug = { height, paint: () => undefined };
  const pages = paginate([before, ...slugs], setting.height);
  return pages
    .map((page) => page.filter(({ slug }) => slugs.includes(slug)).length)
    .filter((count) => count > 0);
}

/** Starting heights all down a page. */
const HEIGHTS = Array.from({ length: Math.floor(setting.height / 10) }, (_, i) => 10 * i);

describe('pages of the PDF', () => {
  it('hold a table of a year whole, wherever it begins', () => {
    const year = tableOf(13);
    for (const height of HEIGHTS) {
      const [first, second = 0] = pagesBehind(height, year);
      // the rule under it, which has no height, may be all that is parted
      expect(first + second).toBe(year.length);
      expect([0, 1]).toContain(second);
    }
  });

  it('part a long table, with two rows at least on each side', () => {
    const long = tableOf(40);
    const parted = HEIGHTS.map((height) => pagesBehind(height, long)).filter(([, second = 0]) => second > 1);
    expect(parted.length).toBeGreaterThan(10);
    for (const [first, second] of parted) {
      expect(first).toBeGreaterThanOrEqual(4); // caption, heads, two rows
      expect(second).toBeGreaterThanOrEqual(3); // two rows and the rule
    }
  });

  it('leave no last item of a list alone', () => {
    const list = listSlugs(['One', 'Two', 'Three', 'Four'], setting);
    const parted = HEIGHTS.flatMap((height) => [height, height + 3, height + 6]).map((height) =>
      pagesBehind(height, list),
    );
    expect(parted.some((pages) => pages.length === 2)).toBe(true);
    for (const [, second = 4] of parted) expect(second).toBeGreaterThanOrEqual(2);
  });
});
