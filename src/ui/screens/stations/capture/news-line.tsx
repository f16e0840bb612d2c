import type { ComponentChildren } from 'preact';
import type { StoredNews } from '../../../../app/capture/capture-news.ts';
import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { newsWords } from './capture-words.ts';

/** What is told while the phone is turned. */
const DURING = new Set<StoredNews['what']>(['open-start', 'mark']);

/** What goes on; null where nothing does. */
function phaseWords({ phase, news }: CaptureSession): string | null {
  if (phase.value !== 'sweeping' || (news.value?.kind === 'stored' && DURING.has(news.value.what)))
    return null;
  return 'Follow the edge, slowly.';
}

/** What came of the last tap, and how many readings are safe on the device. */
export function NewsLine(props: {
  session: CaptureSession;
  /** Told while there is no news, in place of that all is ready. */
  waiting?: string | null;
  children?: ComponentChildren;
}) {
  const { session } = props;
  const news = session.news.value;
  const { stored } = session;
  return (
    <div class="news" data-kind={news?.kind}>
      <p role="status" class="news-text">
        {phaseWords(session) ??
          (news ? newsWords(news) : (props.waiting ?? 'Ready. Feet safe, eyes off the sun.'))}
      </p>
      <p class="small faint news-count">
        <span class="stored-count">{stored}</span> on this device
      </p>
      {props.children}
    </div>
  );
}
