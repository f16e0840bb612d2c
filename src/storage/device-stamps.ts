import { nextStamp, type Stamp } from '../core/sync-protocol/stamp.ts';
import type { Writing } from './transaction.ts';

async function deviceId(transaction: Writing, newId: () => string): Promise<string> {
  const store = transaction.objectStore('device');
  const row = await store.get('device');
  if (row?.name === 'device') return row.id;
  const id = newId();
  await store.put({ name: 'device', id });
  return id;
}

/** The stamp of this act: later than every stamp this device gave before, also when its clock was set back. */
export async function stampOfAct(transaction: Writing, nowMs: number, newId: () => string): Promise<Stamp> {
  const device = await deviceId(transaction, newId);
  const store = transaction.objectStore('device');
  const last = await store.get('last-stamp');
  const stamp = nextStamp(last?.name === 'last-stamp' ? last.stamp : null, nowMs, device);
  await store.put({ name: 'last-stamp', stamp });
  return stamp;
}
