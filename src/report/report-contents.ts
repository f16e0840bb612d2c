import type { ReportContents } from './contents/report-contents.ts';
import type { ReportInput } from './report-input.ts';
import { SECTIONS } from './sections/section-table.ts';
import { shownText } from './shown-text.ts';
import { Speech } from './speech.ts';

/** Writes a report: what it says, section by section, in the language and the units chosen. */
export function reportContents(report: ReportInput): ReportContents {
  const speech = new Speech(report.choices);
  const { words } = speech;
  const { survey, firm, choices } = report;
  const address = survey.site.address ? shownText(survey.site.address, 200) : null;
  return {
    language: speech.tag,
    paper: choices.paper,
    title: words['frame.title'](shownText(survey.title)),
    firm: {
      name: shownText(firm.name),
      lines: firm.lines.slice(0, 6).map((line) => shownText(line)),
      colour: firm.colour,
    },
    about: [
      ...(address ? [address] : []),
      ...(survey.surveyedOn ? [words['frame.visited'](speech.day(survey.surveyedOn))] : []),
      words['frame.made'](speech.day(report.madeOn)),
    ],
    sections: SECTIONS.flatMap(({ id, part, startsPage, write }) => {
      const written = write(report, speech);
      return written ? [{ id, part, ...(startsPage ? { startsPage } : {}), ...written }] : [];
    }),
    foot: words['frame.foot'](report.fingerprint.slice(0, 16)),
    frame: {
      contents: words['frame.contents'],
      page: words['frame.page'],
      letter: words['frame.letter'],
      evidence: words['frame.evidence'],
      boxes: words['frame.boxes'],
    },
  };
}
