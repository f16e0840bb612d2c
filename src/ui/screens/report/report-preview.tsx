import { useEffect, useRef } from 'preact/hooks';
import type { ReportContents } from '../../../report/contents/report-contents.ts';
import { pageStyle } from '../../../report/painters/html/page-style.ts';
import { htmlBody } from '../../../report/painters/html.ts';

/**
 * The report as it will be read, in a frame of its own. The page's style is put in as a sheet object, since the app's content
 * policy allows no style in markup; the page runs no script.
 */
export function ReportPreview({ contents, title }: { contents: ReportContents; title: string }) {
  const frame = useRef<HTMLIFrameElement>(null);
  useEffect(() => {
    const element = frame.current;
    if (!element) return undefined;
    const view = element.contentWindow as (Window & typeof globalThis) | null;
    const inside = element.contentDocument;
    if (!view || !inside) return undefined;
    fill(view, inside, contents);
    const grow = () => {
      element.style.height = `${inside.documentElement.scrollHeight}px`;
    };
    const observer = new ResizeObserver(grow);
    observer.observe(inside.body);
    grow();
    return () => observer.disconnect();
  }, [contents]);
  return <iframe ref={frame} class="report-page" title={title} />;
}

function fill(view: Window & typeof globalThis, inside: Document, contents: ReportContents): void {
  const sheet = new view.CSSStyleSheet();
  sheet.replaceSync(pageStyle(contents));
  inside.adoptedStyleSheets = [sheet];
  inside.documentElement.lang = contents.language;
  inside.body.innerHTML = htmlBody(contents);
  // links of the contents would load the app into the frame
  for (const link of inside.querySelectorAll('a[href^="#"]'))
    link.addEventListener('click', (event) => {
      event.preventDefault();
      inside.getElementById(link.getAttribute('href')!.slice(1))?.scrollIntoView();
    });
}
