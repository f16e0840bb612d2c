import type { Part, ReportContents, Section } from '../contents/report-contents.ts';
import { blocksMarkup } from './html/blocks-markup.ts';
import { plainMarkup, wordsMarkup } from './markup-text.ts';
import { pageStyle } from './html/page-style.ts';

/** Nothing is fetched and nothing runs, whatever stands in the page. */
const CONTENT_POLICY =
  "default-src 'none'; style-src 'unsafe-inline'; img-src data:; base-uri 'none'; form-action 'none'";

/**
 * A report as one HTML page that needs nothing beside it: no script, no network. It turns dark with the reader's device and
 * prints ink on white on the paper chosen.
 */
export function htmlPage(contents: ReportContents): string {
  const { language, title } = contents;
  return `<!doctype html>
<html lang="${plainMarkup(language)}">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${CONTENT_POLICY}">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<meta name="referrer" content="no-referrer">
<title>${plainMarkup(title)}</title>
<style>${pageStyle(contents)}
</style>
</head>
<body>
${htmlBody(contents)}</body>
</html>
`;
}

/** What stands in the page, without its style. */
export function htmlBody(contents: ReportContents): string {
  const { sections, foot, frame } = contents;
  const part = (wanted: Part) => sections.filter((section) => section.part === wanted);
  const [letter, evidence] = [part('letter'), part('evidence')];
  return `${headMarkup(contents)}
<main>
<div>
${letter.slice(0, 1).map(sectionMarkup).join('')}
${navMarkup(frame, letter, evidence)}
${letter.slice(1).map(sectionMarkup).join('\n')}
</div>
${evidence.length > 0 ? evidenceMarkup(frame.evidence, evidence) : ''}
</main>
<footer><p>${wordsMarkup(foot)}</p></footer>
`;
}

function headMarkup({ firm, title, about }: ReportContents): string {
  const name = firm.name && `<strong>${wordsMarkup(firm.name)}</strong>`;
  const lines = firm.lines.filter(Boolean).map((line) => `<li>${wordsMarkup(line)}</li>`);
  const head =
    name || lines.length > 0
      ? `<div class="firm">${name}${lines.length > 0 ? `<ul>${lines.join('')}</ul>` : ''}</div>\n`
      : '';
  const items = about.map((line) => `<li>${wordsMarkup(line)}</li>`).join('');
  return `<header>
${head}<div class="title"><h1>${wordsMarkup(title)}</h1>${items && `<ul class="about">${items}</ul>`}</div>
</header>`;
}

function navMarkup(frame: ReportContents['frame'], letter: Section[], evidence: Section[]): string {
  const list = (name: string, sections: readonly Section[]) =>
    sections.length > 0
      ? `<h3>${wordsMarkup(name)}</h3><ol>${sections
          .map(({ id, heading }) => `<li><a href="#${plainMarkup(id)}">${wordsMarkup(heading)}</a></li>`)
          .join('')}</ol>`
      : '';
  return `<nav aria-labelledby="report-contents"><h2 id="report-contents">${wordsMarkup(frame.contents)}</h2>${list(frame.letter, letter)}${list(frame.evidence, evidence)}</nav>`;
}

const evidenceMarkup = (name: string, sections: readonly Section[]) =>
  `<div>\n<p class="part">${wordsMarkup(name)}</p>\n${sections.map(sectionMarkup).join('\n')}\n</div>`;

const sectionMarkup = ({ id, heading, startsPage, blocks }: Section) =>
  `<section id="${plainMarkup(id)}"${startsPage ? ' class="starts-page"' : ''}>
<h2>${wordsMarkup(heading)}</h2>
${blocksMarkup(blocks, plainMarkup(id))}
</section>`;
