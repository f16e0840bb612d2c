import { ELECTRICAL_LISTS, type ElectricalList } from './site-facts-electrical.ts';
import { ACCESS_FACTS, ROOF_FACTS, type FactGroup, type FactRow } from './site-facts-general.ts';
import type { Site, SiteFact } from './survey.ts';

/** The electrical list of a site: its country's, else the one its time zone hints at, else the general one. */
export function electricalList({ country, timeZone }: Pick<Site, 'country' | 'timeZone'>): ElectricalList {
  const named = country && ELECTRICAL_LISTS.find((list) => list.country === country);
  const hinted = ELECTRICAL_LISTS.find(({ zones }) => zones.some((zone) => timeZone.startsWith(zone)));
  return named || hinted || ELECTRICAL_LISTS[0];
}

function electricalRows({ phases, main, busbar, meter, earthing, limit }: ElectricalList): FactRow[] {
  return [
    { id: 'phases', label: 'Phases and voltage', choices: phases },
    { id: 'main-protection', label: 'Main fuse or breaker', choices: main },
    {
      id: 'busbar',
      label: 'Rating of the busbar',
      choices: busbar,
      hint: 'As printed in the board; not to be guessed.',
    },
    { id: 'free-places', label: 'Free places in the board', choices: ['None', '1', '2', '3', '4', 'More'] },
    { id: 'meter', label: 'Meter', choices: meter },
    {
      id: 'meter-place',
      label: 'Place of the meter',
      choices: ['Cellar', 'Hall', 'Garage', 'Outside wall', 'Boundary box'],
    },
    { id: 'earthing', label: 'Earthing', choices: earthing },
    { id: 'grid-limit', label: 'Limit of the grid operator', choices: limit },
    {
      id: 'other-sources',
      label: 'Other sources and large loads',
      several: true,
      choices: ['Solar array', 'Battery', 'Generator', 'Heat pump', 'Car charger', 'None'],
    },
    {
      id: 'inverter-place',
      label: 'Place for the inverter',
      choices: ['Cellar', 'Garage', 'Attic', 'Outside wall', 'None yet'],
    },
    {
      id: 'cable-way',
      label: 'Way of the cables',
      choices: ['Disused chimney', 'Shaft', 'Outside wall', 'Downpipe side', 'Not clear'],
    },
  ];
}

/** What to know of a site, in groups, with the answers usual in its country. */
export function factGroups(site: Pick<Site, 'country' | 'timeZone'>): FactGroup[] {
  return [
    { id: 'roof', label: 'Roof', rows: ROOF_FACTS },
    { id: 'access', label: 'Access and hazards', rows: ACCESS_FACTS },
    { id: 'electrical', label: 'Electrical service', rows: electricalRows(electricalList(site)) },
  ];
}

/** The answer to one thing as words; empty where there is none. */
export function factText(facts: readonly SiteFact[] | undefined, id: string): string {
  const value = facts?.find((fact) => fact.id === id)?.value;
  return value === undefined ? '' : Array.isArray(value) ? value.join(', ') : value;
}

/** The facts with some of them answered anew; an empty answer takes a fact away. Undefined where none is left. */
export function withFacts(
  facts: readonly SiteFact[] | undefined,
  answers: readonly SiteFact[],
): SiteFact[] | undefined {
  const after = [...(facts ?? [])];
  for (const answer of answers) {
    const place = after.findIndex(({ id }) => id === answer.id);
    const isEmpty = answer.value.length === 0;
    if (place >= 0) after.splice(place, 1, ...(isEmpty ? [] : [{ ...after[place], ...answer }]));
    else if (!isEmpty) after.push(answer);
  }
  return after.length > 0 ? after : undefined;
}
