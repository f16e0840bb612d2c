import { ordered } from '../../../core/survey/order.ts';
import { factGroups, factText } from '../../../core/survey/site-fact-groups.ts';
import type { Survey } from '../../../core/survey/survey.ts';
import { shownText } from '../../shown-text.ts';
import type { SectionKind } from '../section-kind.ts';

/** What was noted of the house, in the surveyor's words. */
export const siteFacts: SectionKind = {
  id: 'site-facts',
  part: 'evidence',
  write: ({ survey }, { words }) => {
    const rows = factRows(survey);
    if (rows.length === 0) return null;
    const columns = [{ head: words['facts.what'] }, { head: words['facts.found'] }];
    return {
      heading: words['facts.heading'],
      blocks: [{ kind: 'table', table: { caption: words['facts.caption'], columns, rows } }],
    };
  },
};

function factRows({ site, facts }: Survey): string[][] {
  if (!facts) return [];
  const labels = new Map(factGroups(site).flatMap(({ rows }) => rows.map(({ id, label }) => [id, label])));
  return ordered(facts).flatMap(({ id, label }) => {
    const text = factText(facts, id);
    return text ? [[shownText(label ?? labels.get(id) ?? id), shownText(text, 600)]] : [];
  });
}
