import type { ClimateChoice, Survey } from '../../../core/survey/survey.ts';
import { dayText, percentText, placeText } from '../../value-text.ts';

function climateText(climate: ClimateChoice): string {
  switch (climate.source) {
    case 'world':
      return 'World climate, 2° grid';
    case 'weather-file':
      return `Weather file ${climate.name}`;
    case 'clear-sky':
      return 'Clear sky';
  }
}

function factsOf({ site, climate, surveyedOn, surveyor, notes }: Survey): [term: string, value: string][] {
  const facts: [string, string | undefined][] = [
    ['Address', site.address],
    ['Position', placeText(site.latitude, site.longitude)],
    [
      'Altitude',
      site.altitude === undefined ? 'not given, counted as 0 m' : `${site.altitude} m above the sea`,
    ],
    ['Time zone', site.timeZone],
    ['Ground reflects', percentText(site.albedo ?? 0.2)],
    ['Climate', climateText(climate)],
    ['Day of visit', surveyedOn && dayText(surveyedOn)],
    ['Surveyor', surveyor],
    ['Notes', notes],
  ];
  return facts.filter((fact): fact is [string, string] => Boolean(fact[1]));
}

/** Where the site is and what is known of it. */
export function SiteSummary({ survey }: { survey: Survey }) {
  return (
    <dl class="facts">
      {factsOf(survey).map(([term, value]) => (
        <div key={term}>
          <dt>{term}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}
