import type { Block, ContentsPhoto, KeyFigure, Table } from '../../contents/report-contents.ts';
import type { Picture } from '../../marks.ts';
import type { Palette } from '../svg.ts';
import { svgText } from '../svg.ts';
import { base64 } from './base64.ts';
import { plainMarkup, wordsMarkup } from '../markup-text.ts';

/** The inks of the frame a picture stands in: the style sheet has them. */
const PAGE_PALETTE: Palette = {
  ink: 'var(--ink)',
  faint: 'var(--faint)',
  rule: 'var(--rule)',
  paper: 'var(--paper)',
  sheet: 'var(--sheet)',
  accent: 'var(--ink)',
};

/** From this many columns on a table is set smaller on paper. */
const MANY_COLUMNS = 8;
/** Up to this many rows a table is kept whole on paper: the months of a year with their sum. */
const FEW_ROWS = 14;

/** Blocks of one section as markup; `id` is the section's and goes before the ids inside it. */
export function blocksMarkup(blocks: readonly Block[], id: string): string {
  return blocks.map((block, place) => blockMarkup(block, `${id}-${place + 1}`)).join('\n');
}

function blockMarkup(block: Block, id: string): string {
  switch (block.kind) {
    case 'answer':
      return `<p class="answer">${wordsMarkup(block.text)}</p>`;
    case 'paragraph':
      return `<p${block.small ? ' class="small"' : ''}>${wordsMarkup(block.text)}</p>`;
    case 'subheading':
      return `<h3>${wordsMarkup(block.text)}</h3>`;
    case 'key-figures':
      return keyFiguresMarkup(block.figures);
    case 'picture':
      return pictureMarkup(block.picture, block.caption, block.alternative, id);
    case 'table':
      return tableMarkup(block.table, id);
    case 'list':
      return listMarkup(block.items);
    case 'pairs':
      return `<dl class="pairs">${block.pairs
        .map(({ term, text }) => `<div><dt>${wordsMarkup(term)}</dt><dd>${wordsMarkup(text)}</dd></div>`)
        .join('')}</dl>`;
    case 'caution':
      return `<div class="caution" role="note" aria-labelledby="${id}"><h3 id="${id}">${wordsMarkup(block.heading)}</h3>${listMarkup(block.items)}</div>`;
    case 'photos':
      return `<div class="photos">${block.photos.map(photoMarkup).join('')}</div>`;
  }
}

const listMarkup = (items: readonly string[]) =>
  items.length > 0 ? `<ul>${items.map((item) => `<li>${wordsMarkup(item)}</li>`).join('')}</ul>` : '';

function keyFiguresMarkup(figures: readonly KeyFigure[]): string {
  const shown = figures.map(
    ({ label, value, range, note }) =>
      `<div><dt>${wordsMarkup(label)}</dt><dd class="value">${valueMarkup(value)}</dd>` +
      (range === null ? '' : `<dd class="range">(${wordsMarkup(range)})</dd>`) +
      `<dd class="note">${wordsMarkup(note)}</dd></div>`,
  );
  return `<dl class="figures">${shown.join('')}</dl>`;
}

/** A number with its unit smaller; percent stays as large as the number. */
function valueMarkup(value: string): string {
  const [, number, unit] = /^(.*\p{N})(\s+\p{L}.*)$/su.exec(value) ?? [null, value, null];
  return unit === null ? wordsMarkup(value) : `${wordsMarkup(number)}<small>${wordsMarkup(unit)}</small>`;
}

function pictureMarkup(picture: Picture, caption: string, alternative: string, id: string): string {
  const svg = svgText(picture, {
    idPrefix: id,
    palette: PAGE_PALETTE,
    font: 'var(--plain)',
    // a small picture is not blown up to the width of the page
    attributes: `role="img" aria-label="${plainMarkup(alternative)}" style="max-width:${Math.round(picture.width * 1.25)}px"`,
  });
  return `<figure><div class="picture">${svg}</div><figcaption>${wordsMarkup(caption)}</figcaption></figure>`;
}

function tableMarkup({ caption, columns, rows, sums }: Table, id: string): string {
  const number = (column: number) => (columns[column]?.number ? ' class="number"' : '');
  const row = (cells: readonly string[]) =>
    `<tr>${cells
      .map((cell, column) =>
        column === 0
          ? `<th scope="row"${number(0)}>${wordsMarkup(cell)}</th>`
          : `<td${number(column)}>${wordsMarkup(cell)}</td>`,
      )
      .join('')}</tr>`;
  const heads = columns.map(({ head }, column) =>
    head === '' ? `<td${number(column)}></td>` : `<th scope="col"${number(column)}>${wordsMarkup(head)}</th>`,
  );
  const classes = [
    ...(columns.length >= MANY_COLUMNS ? ['many'] : []),
    ...(rows.length + (sums?.length ?? 0) <= FEW_ROWS ? ['short'] : []),
  ];
  return (
    `<div class="scroll" role="group" tabindex="0" aria-labelledby="${id}"><table class="${classes.join(' ')}">` +
    `<caption id="${id}">${wordsMarkup(caption)}</caption><thead><tr>${heads.join('')}</tr></thead>` +
    `<tbody>${rows.map(row).join('')}</tbody>` +
    (sums && sums.length > 0 ? `<tbody class="sums">${sums.map(row).join('')}</tbody>` : '') +
    '</table></div>'
  );
}

function photoMarkup({ image, caption, alternative }: ContentsPhoto): string {
  const shown = image
    ? `<img src="data:${image.type === 'image/png' ? 'image/png' : 'image/jpeg'};base64,${base64(image.bytes)}" alt="${plainMarkup(alternative)}" width="${whole(image.width)}" height="${whole(image.height)}">`
    : `<p class="missing">${wordsMarkup(alternative)}</p>`;
  return `<figure>${shown}<figcaption>${wordsMarkup(caption)}</figcaption></figure>`;
}

const whole = (size: number) => (Number.isFinite(size) ? Math.max(1, Math.round(size)) : 1);
