import type { CaptureSession } from '../../../../app/capture/capture-session.ts';
import { newsWords } from './capture-words.ts';

/** What came of the last tap, and how many readings are safe on the device. */
export function NewsLine({ session }: { session: CaptureSession }) {
  const news = session.news.value;
  const { stored } = session;
  return (
    <div class="news" data-kind={news?.kind}>
      <p role="status" class="news-text">
        {news ? newsWords(news) : 'Ready.'}
      </p>
      <p class="small faint news-count">
        <span class="stored-count">{stored}</span> on this device
      </p>
    </div>
  );
}
