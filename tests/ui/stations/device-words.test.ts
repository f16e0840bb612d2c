import { describe, expect, it } from 'vitest';
import { deviceName } from '../../../src/ui/screens/stations/device-words.ts';

// forms of browsers' words: common practice, no source
const DESK = 'Mozilla/5.0 (X11; Linux x86_64) AppleWebKit/537.36';

describe('what a sitting was sighted with', () => {
  it('is the name of the phone where there is one', () => {
    expect(deviceName('Linux; Android 13; Invented 7 Build/TQ1A', DESK)).toBe('Invented 7');
    expect(deviceName('iPhone; CPU iPhone OS 17_4 like Mac OS X', DESK)).toBe('iPhone');
    expect(deviceName('Practice recording (simulated phone)', DESK)).toBe(
      'Practice recording (simulated phone)',
    );
  });

  it('is this device where that is the same and has no name, and never the words of a browser', () => {
    expect(deviceName('X11; Linux x86_64', DESK)).toBe('this device');
    expect(deviceName('Windows NT 10.0; Win64; x64', DESK)).toBe('a device without a name');
    expect(deviceName('Linux; Android 10; K', DESK)).toBe('a device without a name');
    expect(deviceName('Android 14; Mobile; rv:125.0', DESK)).toBe('a device without a name');
    expect(deviceName(undefined, DESK)).toBe('a phone');
  });
});
