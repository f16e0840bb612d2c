import type { Slug } from './slug.ts';

export interface PlacedSlug {
  slug: Slug;
  /** From the top of the text's frame, in points. */
  y: number;
}

/** Lays slugs on pages of one height; those that belong together stay together where a page can hold them. */
export function paginate(slugs: readonly Slug[], height: number): PlacedSlug[][] {
  const pages: PlacedSlug[][] = [[]];
  let used = 0;
  const place = (slug: Slug) => {
    const page = pages.at(-1)!;
    const y = page.length > 0 ? used + (slug.gap ?? 0) : 0;
    page.push({ slug, y });
    used = y + slug.height;
  };
  const turn = () => {
    if (pages.at(-1)!.length === 0) return;
    pages.push([]);
    used = 0;
  };
  for (const group of groupsKept(slugs)) {
    if (group[0].startsPage) turn();
    if (used + extent(group) > height && fitsOnePage(group, height)) turn();
    for (const slug of group) {
      if (used + (slug.gap ?? 0) + slug.height > height) turn();
      if (pages.at(-1)!.length === 0) slug.repeat?.forEach(place);
      place(slug);
    }
  }
  return pages;
}

function groupsKept(slugs: readonly Slug[]): Slug[][] {
  const groups: Slug[][] = [];
  let open = false;
  for (const slug of slugs) {
    if (open && !slug.startsPage) groups.at(-1)!.push(slug);
    else groups.push([slug]);
    open = slug.keep ?? false;
  }
  return groups;
}

const extent = (group: readonly Slug[]) => group.reduce((sum, { gap = 0, height }) => sum + gap + height, 0);

function fitsOnePage(group: readonly Slug[], height: number): boolean {
  return extent(group) - (group[0].gap ?? 0) + extent(group[0].repeat ?? []) <= height;
}
