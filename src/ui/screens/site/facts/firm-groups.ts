import { firmRow } from '../../../../core/survey/fact-lists.ts';
import { electricalList, factGroups } from '../../../../core/survey/site-fact-groups.ts';
import type { FactGroup } from '../../../../core/survey/site-facts-general.ts';
import type { Site } from '../../../../core/survey/survey.ts';
import { firmLists } from '../../../device/firm-lists.ts';

/** What to know of a site, with the answers that the firm offers in its country. */
export function firmGroups(site: Pick<Site, 'country' | 'timeZone'>): FactGroup[] {
  const { country } = electricalList(site);
  const lists = firmLists.value;
  return factGroups(site).map((group) => ({
    ...group,
    rows: group.rows.map((row) => firmRow(row, lists, group.id === 'electrical' ? country : undefined)),
  }));
}
