import type { CalculationFault } from '../../../core/shading/calculation.ts';
import type { Message } from '../../messages.ts';

/** What stopped a calculation, and what to do. */
export const CALCULATION_MESSAGES: Record<CalculationFault['code'], Message> = {
  cancelled: {
    what: 'The calculation was stopped.',
    remedy: 'Nothing is lost; start it again when you like.',
  },
  'climate-missing': {
    what: 'The climate of the world that comes with Noonmark did not load.',
    remedy:
      'It is kept on this device after the first visit with a connection. Connect once and try again, or choose the clear sky or a weather file below.',
  },
  'weather-file-missing': {
    what: 'The weather file this survey names is not kept on this device.',
    remedy: 'Add the file below, or choose another climate.',
  },
  'weather-file-refused': {
    what: 'The weather file cannot be used.',
    remedy: 'Add another EPW or TMY3 file with all hours of a year.',
  },
  failed: {
    what: 'The calculation broke off.',
    remedy: 'Try again. If it breaks off again, export the survey and report it with the words below.',
  },
};
