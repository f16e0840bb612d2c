import { readFileSync } from 'node:fs';
import { getPosition } from 'suncalc';
import { blockedSpans } from '../../src/core/horizon/blocked-spans.ts';
import { horizonProfile } from '../../src/core/horizon/horizon-profile.ts';
import { stationHorizon, tracedObstructions } from '../../src/core/horizon/station-horizon.ts';
import type { Climate } from '../../src/core/irradiance/climate.ts';
import { weatherFileClimate } from '../../src/core/irradiance/weather-file-climate.ts';
import { parseWeatherFile } from '../../src/core/irradiance/weather-file.ts';
import { worldClimate } from '../../src/core/irradiance/world-climate.ts';
import { decodeWorldGrid } from '../../src/core/irradiance/world-grid.ts';
import { assessStation } from '../../src/core/shading/assess-station.ts';
import { DEFAULT_STEP_MINUTES, siteLight } from '../../src/core/shading/site-light.ts';
import { obstructionsById } from '../../src/core/survey/served-planes.ts';
import { blockedLight, shadedMonths } from '../../src/core/shading/blocked-light.ts';
import { skyMap } from '../../src/core/shading/sky-map.ts';
import { pointSurvey } from '../../src/core/pointing/point-survey.ts';
import { standardOffsetMinutes } from '../../src/core/solar-position/time-zone.ts';
import { parseSurvey } from '../../src/core/survey/parse-survey.ts';
import type { Survey } from '../../src/core/survey/survey.ts';
import { accessInterval, drawAccess, drawnSurvey } from '../../src/core/uncertainty/access-interval.ts';
import { uncertainStation } from '../../src/core/uncertainty/uncertain-station.ts';
import { weatherText } from '../reference-values/weather-text.ts';
import { withBuiltApp } from './built-app.ts';
import { surveyEvidence } from '../../src/core/assessment/survey-evidence.ts';
import { htmlPage } from '../../src/report/painters/html.ts';
import { reportContents } from '../../src/report/report-contents.ts';
import { exactness } from './exactness.ts';
import { frameTimes, frameWords } from './frames.ts';
import { assessMemory } from './memory.ts';
import { pdfTimes, pdfWords } from './pdf-time.ts';
import { builtSizes } from './sizes.ts';
import { medians } from './timing.ts';

/**
 * How fast and how exact, as ratios to T0: the time that the solar position library alone takes for every minute of a
 * year at the same site, in the same run. `--json` for machines.
 */
const SURVEY = 'survey-samples/suburban-maple-and-gable.json';
const ROUNDS = 9;
const FURTHER = 50;

const survey = surveyOf(readFileSync(SURVEY, 'utf8'));
const { latitude, longitude, altitude = 0, timeZone } = survey.site;
const site = { latitude, longitude, altitude, utcOffset: standardOffsetMinutes(timeZone) };
const plane = survey.planes[0];
const station = survey.stations[0];
const grid = worldGrid();
const epw = weatherText('USA_IL_Chicago-OHare.Intl.AP.725300_TMY3.epw');

function assess(climate: Climate) {
  const light = siteLight(survey.site, climate);
  const map = skyMap(light.year, light.grid, plane.surfaceTilt, plane.surfaceAzimuth);
  assessStation(map, stationHorizon(survey, station), station, obstructionsById(survey));
  return map;
}

const world = () => worldClimate(grid, survey.site);
const map = assess(world());
const profile = horizonProfile(tracedObstructions(survey, station));
const traced = tracedObstructions(survey, station);

const pointed = pointSurvey(survey);
const uncertain = uncertainStation(survey, station, pointed);

/** All of it for one station: the survey's shared draws, the condensed map, the draws, their interval. */
function drawInterval(sources: boolean) {
  const drawn = drawnSurvey(pointed, latitude, 'world', { seed: survey.id, sources });
  return accessInterval([drawAccess(map, uncertain, 0.94, drawn)], drawn);
}

const evidence = await surveyEvidence(survey, world());

/** The report of the whole survey as a page, from its results. */
const reportPage = () =>
  htmlPage(
    reportContents({
      ...evidence,
      survey,
      fingerprint: '0'.repeat(64),
      madeOn: '2026-06-02',
      version: '0',
      photos: new Map(),
      firm: { name: '', lines: [], colour: null },
      choices: { language: 'en', units: 'metric', paper: 'a4', thresholds: {} },
      compared: null,
    }),
  );

const times = medians(
  {
    t0: () => {
      const start = Date.UTC(2025, 0, 1);
      for (let minute = 0; minute < 525_600; minute++)
        getPosition(new Date(start + minute * 60_000), latitude, longitude);
    },
    world: () => assess(world()),
    weatherFile: () => {
      const file = parseWeatherFile(epw, 'chicago');
      if (!file.ok) throw new Error('the weather file must be readable');
      assess(weatherFileClimate(file.value, survey.site));
    },
    profiles: () => {
      for (let i = 0; i < FURTHER; i++) shadedMonths(map, blockedLight(map, blockedSpans(profile)));
    },
    profilesFromTraces: () => {
      for (let i = 0; i < FURTHER; i++)
        shadedMonths(map, blockedLight(map, blockedSpans(horizonProfile(traced))));
    },
    draws: () => drawInterval(false),
    drawsAndSources: () => drawInterval(true),
    report: reportPage,
  },
  ROUNDS,
);

const built = await withBuiltApp(async (folder) => ({
  sizes: builtSizes(folder),
  frames: await frameTimes(folder),
  pdf: await pdfTimes(folder),
}));

const results = {
  t0Ms: times.t0,
  stepMinutes: DEFAULT_STEP_MINUTES,
  ratios: [
    ratio('one station, map included, world climate', times.world, 0.5),
    ratio('the same with a weather file, parsing included', times.weatherFile, 1),
    ratio('each further profile, annual and monthly', times.profiles / FURTHER, 1 / 1000),
    ratio('the same from its traces', times.profilesFromTraces / FURTHER, null),
    ratio('1,000 Monte Carlo draws for one station', times.draws, 0.3),
    ratio('the same with its ranked sources', times.drawsAndSources, null),
    ratio('the report: contents and page, from the results', times.report, 0.3),
  ],
  exactness: exactness(map, world(), site),
  assessMemoryMB: { value: assessMemory(SURVEY), bar: 200 },
  gzippedKB: { ...built.sizes, bars: { firstScreen: 90, precache: 1200 } },
  frames: built.frames,
  pdf: built.pdf,
};

if (process.argv.includes('--json')) console.log(JSON.stringify(results, null, 2));
else print(results);

function ratio(what: string, ms: number, bar: number | null) {
  return { what, ms, toT0: ms / times.t0, bar };
}

function print({
  t0Ms,
  stepMinutes,
  ratios,
  exactness: rows,
  assessMemoryMB,
  gzippedKB,
  frames,
  pdf,
}: typeof results): void {
  console.log(`T0, the library's positions for every minute of a year: ${t0Ms.toFixed(0)} ms`);
  console.log(`Steps of ${stepMinutes} minutes\n`);
  for (const { what, ms, toT0, bar } of ratios)
    console.log(
      `${what.padEnd(50)} ${ms.toFixed(2).padStart(8)} ms  ${toT0.toFixed(5)} T0${bar ? `  (bar ${bar})` : ''}`,
    );
  console.log(
    '\nSolar access against a pass over every minute, percentage points (bars 0.05 annual, 0.2 monthly)',
  );
  for (const { profile: name, loss, annual, worstMonth } of rows)
    console.log(
      `${name.padEnd(50)} loss ${loss.toFixed(3).padStart(7)}  annual ${annual.toFixed(4)}  worst month ${worstMonth.toFixed(4)}`,
    );
  console.log(
    `\nPeak memory of assess on one file: ${assessMemoryMB.value.toFixed(0)} MB (bar ${assessMemoryMB.bar})`,
  );
  const { firstScreen, precache, bars } = gzippedKB;
  console.log(
    `JavaScript for the first screen, gzipped: ${firstScreen.toFixed(1)} kB (bar ${bars.firstScreen})`,
  );
  console.log(`Whole offline app, gzipped: ${precache.toFixed(1)} kB (bar ${bars.precache})`);
  console.log(`\n${frameWords(frames)}`);
  console.log(`\n${pdfWords(pdf)}`);
}

function surveyOf(text: string): Survey {
  const parsed = parseSurvey(text);
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.problems));
  return parsed.value;
}

function worldGrid() {
  const bytes = readFileSync('public/world-climate.bin');
  const decoded = decodeWorldGrid(bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.byteLength));
  if (!decoded.ok) throw new Error(JSON.stringify(decoded.problems));
  return decoded.value;
}
