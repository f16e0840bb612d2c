import { expose } from 'comlink';
import { ClimateSource } from './climate-source.ts';
import { ShadeEngine } from './shade-engine.ts';

async function gridBytes(): Promise<ArrayBuffer> {
  const response = await fetch('/world-climate.bin');
  if (!response.ok) throw new Error(`world-climate.bin: ${response.status}`);
  return response.arrayBuffer();
}

/** A turn of the event loop, in which messages are let in. */
const breathe = () => new Promise<void>((resolve) => setTimeout(resolve));

expose(new ShadeEngine(new ClimateSource(gridBytes), breathe));
