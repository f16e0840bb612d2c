import type { ReportContents } from '../../contents/report-contents.ts';
import { styleString } from '../markup-text.ts';

/** Paper and ink on a screen, dark with the reader's device, pictures and all; print is always ink on white. */
const INKS = `
:root{color-scheme:light;--paper:#fbf8f0;--sheet:#f1ecdf;--ink:#14120d;--faint:#4d483c;--rule:#c4baa3;--firm:var(--ink);
--serif:ui-serif,'Iowan Old Style','Palatino Linotype',Palatino,'Book Antiqua','Noto Serif','DejaVu Serif',serif;
--plain:system-ui,'Segoe UI',Roboto,'Noto Sans',sans-serif}
@media screen and (prefers-color-scheme:dark){:root{color-scheme:dark;--paper:#14120d;--sheet:#211e17;--ink:#f6f1e3;--faint:#c9c1ad;--rule:#4a4436}}
@media print{:root{--paper:#fff;--sheet:#fff;--ink:#000;--faint:#33302a;--rule:#9c937d}}`;

const TYPE = `
*,*::before,*::after{box-sizing:border-box}
html{background:var(--paper);color:var(--ink);font:1.0625rem/1.55 var(--serif);font-variant-numeric:lining-nums tabular-nums;
-webkit-text-size-adjust:100%;text-size-adjust:100%}
body{margin:0 auto;max-width:46rem;padding:1.75rem 1.25rem 3rem;overflow-wrap:anywhere}
h1,h2,h3,p,ul,dl,dd,figure{margin:0}
h1,h2,h3{line-height:1.2;font-weight:600;text-wrap:balance}
h1{font-size:2rem;letter-spacing:-.01em}
h2{font-size:1.5rem}
h3{font-size:1.125rem;margin-top:1.75rem}
p,ul,dl,figure,.scroll,.caution,.photos{margin-top:1rem}
p,li{max-width:38rem;text-wrap:pretty}
ul{padding-left:1.2rem}
li+li{margin-top:.35rem}
.small,figcaption,caption,.missing{font-size:.9375rem;color:var(--faint);line-height:1.45}
.answer{font-size:1.375rem;line-height:1.4}
a{color:inherit;text-decoration-thickness:1px;text-underline-offset:.2em}
:focus-visible{outline:3px solid var(--ink);outline-offset:3px}`;

const HEAD = `
.firm{display:flex;flex-wrap:wrap;justify-content:space-between;gap:.25rem 2rem;padding-bottom:.75rem;font-size:.9375rem;line-height:1.4}
.firm strong{font-size:1.125rem}
.firm ul{list-style:none;padding:0;margin:0;color:var(--faint)}
.firm li+li{margin-top:0}
header{border-top:5px solid var(--firm);padding-top:.875rem}
.title{border-top:1px solid var(--ink);padding-top:1.75rem}
.title:first-child{border-top:0;padding-top:.75rem}
.about{list-style:none;padding:0;margin-top:.75rem;color:var(--faint);font-style:italic;display:flex;flex-wrap:wrap;gap:0 1.75rem}
.about li+li{margin-top:0}
nav{margin-top:3rem;border:solid var(--ink);border-width:2px 0 1px;padding:.75rem 0 1rem}
nav h2{font-size:1.125rem}
nav h3{margin:1rem 0 0;font-size:.9375rem;font-style:italic;font-weight:400;color:var(--faint)}
nav ol{list-style:none;margin:.25rem 0 0;padding:0}
nav li{margin:0;border-bottom:1px solid var(--rule)}
nav li:last-child{border-bottom:0}
nav a{display:block;padding:.45rem 0;text-decoration:none}
nav a:hover{text-decoration:underline}`;

const BODY = `
section{margin-top:3rem;border-top:1px solid var(--ink);padding-top:1rem;scroll-margin-top:.5rem}
main>div:first-child>section:first-of-type{margin-top:1.75rem}
.part{max-width:none;margin-top:4.5rem;border-top:5px solid var(--firm);padding-top:.75rem;font-size:1.125rem;font-style:italic;color:var(--faint)}
.part+section{margin-top:1.5rem}
.figures{display:grid;grid-template-columns:repeat(auto-fit,minmax(min(100%,11.5rem),1fr));border:solid var(--ink);border-width:2px 0 1px;margin-top:1.5rem;row-gap:0}
.figures>div{display:grid;grid-row:span 4;grid-template-rows:subgrid;align-content:start;padding:.75rem 1.25rem .9rem 0}
.figures dt{align-self:end;font-size:.9375rem;line-height:1.3;color:var(--faint)}
.figures .value{font-size:2.75rem;line-height:1.15;letter-spacing:-.02em;white-space:nowrap}
.figures .value small{font-size:1.25rem;letter-spacing:0}
.figures .range{text-wrap:balance;font-size:1.0625rem}
.figures .note{grid-row:4;font-size:.875rem;line-height:1.4;font-style:italic;color:var(--faint);margin-top:.25rem;max-width:19rem}
@media (max-width:37.5em){.figures>div+div{border-top:1px solid var(--rule)}}
@media (min-width:37.51em){.figures>div+div{border-left:1px solid var(--rule);padding-left:1.25rem}}
figure{margin-top:1.5rem}
figcaption{margin-top:.5rem;max-width:38rem}
.picture svg{display:block;width:100%;height:auto;margin:0 auto}
.scroll{overflow-x:auto;overscroll-behavior-x:contain}
table{border-collapse:collapse;width:100%;border-bottom:2px solid var(--ink);font-size:.9375rem;line-height:1.4;overflow-wrap:break-word}
caption{text-align:left;padding-bottom:.5rem;caption-side:top}
thead{border:solid var(--ink);border-width:2px 0 1px}
th,td{padding:.4rem .875rem .4rem 0;text-align:left;vertical-align:baseline;font-weight:400}
th:last-child,td:last-child{padding-right:0}
thead th{font-size:.875rem;line-height:1.25;vertical-align:bottom;color:var(--faint)}
th[scope=row]{min-width:5.5rem;max-width:16rem}
td{min-width:2.5rem;max-width:22rem}
tbody tr+tr{border-top:1px solid var(--rule)}
.number{text-align:right;white-space:nowrap}
thead .number{white-space:normal}
.number+:not(.number){padding-left:1rem}
.sums{border-top:1px solid var(--ink)}
.sums th,.sums td{font-weight:600}
.many,.many thead th{font-size:.875rem}
.many th,.many td{padding-right:.5rem}
.pairs{border:solid var(--ink);border-width:2px 0 1px;font-size:.9375rem;line-height:1.45}
.pairs>div{display:grid;grid-template-columns:minmax(8rem,13rem) 1fr;gap:0 1.25rem;padding:.4rem 0}
.pairs>div+div{border-top:1px solid var(--rule)}
.pairs dt{color:var(--faint)}
@media (max-width:30em){.pairs>div{grid-template-columns:1fr}}
.caution{border:2px solid var(--ink);padding:.875rem 1.125rem 1rem}
.caution h3{margin-top:0}
.caution ul{margin-top:.5rem}
.photos{display:grid;grid-template-columns:repeat(auto-fill,minmax(min(100%,17rem),1fr));gap:1.25rem}
.photos figure{margin-top:0}
.photos img{display:block;width:100%;height:auto;border:1px solid var(--rule)}
.missing{margin:0;border:1px dashed var(--faint);padding:2rem 1rem;text-align:center}
footer{margin-top:4rem;border-top:1px solid var(--ink);padding-top:.75rem;font-size:.875rem;color:var(--faint)}`;

/** On a phone pictures take the whole width; on a desk the list of contents stands in the margin. */
const SIZES = `
@media screen and (max-width:37.5em){.picture{margin:0 -1rem}h1{font-size:1.75rem}h2{font-size:1.375rem}.answer{font-size:1.25rem}}
@media screen and (min-width:72em){
body{max-width:65rem;padding:3rem 0 5rem 19rem}
nav{position:fixed;top:3rem;left:max(1.5rem,calc(50vw - 32.5rem));width:15rem;margin:0;max-height:calc(100vh - 6rem);overflow-y:auto;font-size:.9375rem;line-height:1.35}}`;

const PAPER = `
@media print{
html{font-size:10.5pt;line-height:1.45;background:#fff}
body{max-width:none;padding:0}
nav,footer{display:none}
header{border-top-width:3pt;padding-top:6pt}
.firm{padding-bottom:6pt}
.about{margin-top:5pt}
p,ul,dl,figure,.scroll,.caution,.photos{margin-top:8pt}
p,li,figcaption{max-width:44rem}
.figures,figure{margin-top:11pt}
.figures>div{padding-top:6pt;padding-bottom:7pt}
main>div:first-child>section:first-of-type{margin-top:12pt}
h1{font-size:19pt}h2{font-size:15pt}.answer{font-size:13.5pt}
.figures .value{font-size:27pt}.figures .value small{font-size:13pt}
.figures{grid-template-columns:repeat(3,1fr)}
section{margin-top:18pt;padding-top:7pt}
.title{padding-top:10pt}
.part{margin-top:0;break-before:page}
.starts-page{break-before:page;margin-top:0}
.part+.starts-page{break-before:auto}
main>div:first-child>.starts-page:first-child{break-before:auto}
h2,h3,.part,.answer,caption,.figures dt,p:has(+figure),p:has(+.scroll){break-after:avoid}
p,li,dd{orphans:3;widows:3}
.answer,figure,.short,.scroll:has(.short),p:has(+.scroll),.figures,.figures>div,tr,.pairs>div,.caution,.photos figure{break-inside:avoid}
figcaption,li+li:last-child{break-before:avoid}
.scroll{overflow:visible}
thead{display:table-header-group}
table{font-size:9pt}
.many,.many thead th{font-size:7.5pt}
.many th,.many td{padding-right:3pt}
th,td{padding-top:2.5pt;padding-bottom:2.5pt}
.many th[scope=row]{min-width:0}.many td{min-width:0}
.photos{grid-template-columns:1fr 1fr}
.picture svg{max-height:170mm;max-width:150mm!important;margin:0}
a{text-decoration:none}}`;

/** The style sheet of a report's page. */
export function pageStyle({ paper, foot, firm, frame }: ReportContents): string {
  const size = paper === 'letter' ? 'letter' : 'A4';
  const words = 'font:8pt ui-serif,serif;color:#33302a;vertical-align:top;padding-top:4mm';
  const foots =
    `@bottom-left{content:${styleString(foot)};${words}}` +
    `@bottom-right{content:${pageNumber(frame.page)};${words}}`;
  const colour = firm.colour !== null && /^#[0-9a-f]{6}$/i.test(firm.colour) ? firm.colour : null;
  return (
    INKS +
    TYPE +
    HEAD +
    BODY +
    SIZES +
    PAPER +
    `\n@page{size:${size};margin:17mm 19mm 20mm;${foots}}` +
    (colour ? `\n:root{--firm:${colour}}` : '')
  );
}

/** Numbers that no sentence about a page has in it otherwise. */
const [SOME_PAGE, ALL_PAGES] = [907, 941];

/** "Page 3 of 9" as content that the printer counts; nothing where the words hide the numbers. */
function pageNumber(page: ReportContents['frame']['page']): string {
  const parts = page(SOME_PAGE, ALL_PAGES).split(new RegExp(`(${SOME_PAGE}|${ALL_PAGES})`));
  const counters: Record<string, string> = {
    [SOME_PAGE]: 'counter(page)',
    [ALL_PAGES]: 'counter(pages)',
  };
  return (
    parts
      .filter(Boolean)
      .map((part) => counters[part] ?? styleString(part))
      .join(' ') || '""'
  );
}
