import { useEffect, useState } from 'preact/hooks';
import { useApp } from '../../app-context.ts';
import { installOffer, isInstalled } from '../../device/install-offer.ts';
import { offlineReadiness } from '../../device/offline-readiness.ts';
import { storageSpace, type StorageSpace } from '../../device/storage-space.ts';
import { sizeText } from '../../messages.ts';

function spaceText({ used, kept }: StorageSpace): string {
  return `Space used: ${sizeText(used)}. ${
    kept
      ? 'The browser keeps it until you erase it.'
      : 'The browser may clear it when the device runs short of room: back up what matters.'
  }`;
}

const READINESS = {
  unknown: '',
  fetching: 'Fetching what is needed without a signal; keep the connection a moment longer.',
  ready: 'All of Noonmark is on this device: it opens without a signal.',
};

function InstallAdvice() {
  if (isInstalled()) return null;
  const offer = installOffer.value;
  return (
    <div class="stack">
      <p class="small">
        Install Noonmark on the home screen before you survey: it then opens without a signal and its surveys
        are kept longer. {offer === null && 'Use “Install” or “Add to Home Screen” in the browser’s menu.'}{' '}
        Surveys made in a browser tab may not move along; back them up first, and restore them after.
      </p>
      {offer && (
        <div>
          <button type="button" onClick={() => void offer.prompt()}>
            Install
          </button>
        </div>
      )}
    </div>
  );
}

/** How much room is used, whether the browser keeps it, and how to make it stay. */
export function StorageLine() {
  const { state } = useApp();
  const [space, setSpace] = useState<StorageSpace | null>(null);
  const surveys = state.surveys.value;
  useEffect(() => {
    void storageSpace().then(setSpace);
  }, [surveys]);
  return (
    <section class="stack" aria-label="Storage on this device">
      <p class="small" role="status">
        {READINESS[offlineReadiness.value]}
      </p>
      {space && surveys && <p class="small">{spaceText(space)}</p>}
      <InstallAdvice />
    </section>
  );
}
