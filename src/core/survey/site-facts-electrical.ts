/**
 * Usual answers on the electrical service, by country. Common practice, no source: they spare typing and settle
 * nothing; what holds is written on the meter, the board and the grid operator's answer.
 */
export interface ElectricalList {
  /** ISO 3166-1; `ZZ`, which is no country's, for the list that stands where no country's own does. */
  country: string;
  name: string;
  /** Time zones that hint at the country, by their beginnings. */
  zones: readonly string[];
  phases: readonly string[];
  /** Main fuse or breaker. */
  main: readonly string[];
  busbar: readonly string[];
  meter: readonly string[];
  earthing: readonly string[];
  /** What the grid operator allows. */
  limit: readonly string[];
}

const amperes = (...ratings: number[]) => ratings.map((rating) => `${rating} A`);
const PHASES_230 = ['Single phase, 230 V', 'Three phase, 400 V'];
const BUSBAR_IEC = [...amperes(63, 80, 100, 125), 'Not marked'];
const METERS = ['Smart meter', 'Digital meter', 'Turning-disc meter', 'Through current transformers'];
const EARTHING_IEC = ['TN-S', 'TN-C-S', 'TT', 'Not found'];
const LIMITS = [
  'None known',
  'Limited power',
  'Limited share of the capacity',
  'No feed-in',
  'Permission first',
];

const europe = (
  country: string,
  name: string,
  zones: readonly string[],
  own: Partial<ElectricalList>,
): ElectricalList => ({
  country,
  name,
  zones,
  phases: PHASES_230,
  main: amperes(25, 32, 40, 50, 63, 80, 100),
  busbar: BUSBAR_IEC,
  meter: METERS,
  earthing: EARTHING_IEC,
  limit: LIMITS,
  ...own,
});

const northAmerica = {
  main: amperes(60, 100, 125, 150, 200, 225, 400),
  busbar: [...amperes(100, 125, 150, 200, 225, 400), 'Not marked'],
  meter: ['Smart meter in a socket', 'Meter in a socket', 'Meter and main in one box', 'Bank of meters'],
  earthing: ['Rods', 'Water pipe', 'Electrode in concrete', 'Plate', 'Not found'],
  limit: [...LIMITS, 'Rule of the busbar applies'],
};

export const ELECTRICAL_LISTS: readonly ElectricalList[] = [
  europe('ZZ', 'Another country', [], {}),
  europe('AU', 'Australia', ['Australia/'], {
    phases: ['Single phase, 230 V', 'Two phase', 'Three phase, 400 V'],
    main: amperes(40, 63, 80, 100),
    earthing: ['Multiple earthed neutral', 'Not found'],
    limit: ['None known', '5 kW a phase', '1.5 kW a phase', 'Flexible by the operator', 'No feed-in'],
  }),
  europe('AT', 'Austria', ['Europe/Vienna'], { main: amperes(25, 35, 50, 63) }),
  europe('BE', 'Belgium', ['Europe/Brussels'], {
    phases: ['Single phase, 230 V', 'Three phase, 3 × 230 V', 'Three phase, 400 V'],
    main: amperes(25, 32, 40, 50, 63),
  }),
  europe('BR', 'Brazil', ['America/Sao_Paulo', 'America/Bahia', 'America/Fortaleza', 'America/Recife'], {
    phases: [
      'Single phase, 127 V',
      'Single phase, 220 V',
      'Two phase, 127/220 V',
      'Three phase, 127/220 V',
      'Three phase, 220/380 V',
    ],
    main: amperes(40, 50, 63, 70, 80, 100),
  }),
  {
    country: 'CA',
    name: 'Canada',
    zones: [
      'America/Toronto',
      'America/Vancouver',
      'America/Montreal',
      'America/Edmonton',
      'America/Winnipeg',
      'America/Halifax',
      'America/Regina',
      'America/St_Johns',
    ],
    phases: ['Single phase, 120/240 V', 'Three phase, 120/208 V', 'Three phase, 347/600 V'],
    ...northAmerica,
  },
  europe('DE', 'Germany', ['Europe/Berlin', 'Europe/Busingen'], {
    main: amperes(25, 35, 50, 63, 80, 100),
    earthing: [...EARTHING_IEC, 'Electrode in the foundation'],
  }),
  europe('ES', 'Spain', ['Europe/Madrid', 'Atlantic/Canary', 'Africa/Ceuta'], {
    main: amperes(25, 32, 40, 50, 63),
  }),
  europe('FR', 'France', ['Europe/Paris'], { main: amperes(15, 30, 45, 60, 90) }),
  europe('GB', 'Great Britain and Northern Ireland', ['Europe/London', 'Europe/Belfast'], {
    main: amperes(60, 80, 100),
    meter: ['Smart meter', 'Credit meter', 'Prepayment meter', 'Through current transformers'],
    earthing: ['TN-C-S', 'TN-S', 'TT', 'Not found'],
  }),
  europe('IE', 'Ireland', ['Europe/Dublin'], { main: amperes(63, 80, 100) }),
  europe('IN', 'India', ['Asia/Kolkata', 'Asia/Calcutta'], {
    phases: ['Single phase, 230 V', 'Three phase, 415 V'],
    main: amperes(32, 40, 63, 100),
  }),
  europe('IT', 'Italy', ['Europe/Rome'], {
    main: ['3 kW agreed', '4.5 kW agreed', '6 kW agreed', '10 kW agreed', '15 kW agreed'],
  }),
  {
    country: 'JP',
    name: 'Japan',
    zones: ['Asia/Tokyo'],
    phases: ['Single phase, two wires, 100 V', 'Single phase, three wires, 100/200 V', 'Three phase, 200 V'],
    main: amperes(20, 30, 40, 50, 60, 75, 100),
    busbar: [...amperes(40, 50, 60, 75, 100), 'Not marked'],
    meter: METERS,
    earthing: ['Class D', 'Class C', 'Not found'],
    limit: LIMITS,
  },
  europe('NL', 'Netherlands', ['Europe/Amsterdam'], {
    main: [
      '1 × 25 A',
      '1 × 35 A',
      '1 × 40 A',
      '3 × 25 A',
      '3 × 35 A',
      '3 × 40 A',
      '3 × 50 A',
      '3 × 63 A',
      '3 × 80 A',
    ],
  }),
  europe('NZ', 'New Zealand', ['Pacific/Auckland', 'Pacific/Chatham'], {
    main: amperes(40, 63, 80, 100),
    earthing: ['Multiple earthed neutral', 'Not found'],
  }),
  europe('PL', 'Poland', ['Europe/Warsaw'], { main: amperes(16, 20, 25, 32, 35, 40, 50, 63) }),
  europe('PT', 'Portugal', ['Europe/Lisbon', 'Atlantic/Madeira', 'Atlantic/Azores'], {
    main: [
      '3.45 kVA agreed',
      '4.6 kVA agreed',
      '5.75 kVA agreed',
      '6.9 kVA agreed',
      '10.35 kVA agreed',
      '13.8 kVA agreed',
      '20.7 kVA agreed',
    ],
  }),
  europe('CH', 'Switzerland', ['Europe/Zurich'], { main: amperes(25, 40, 63, 80, 100) }),
  {
    country: 'US',
    name: 'United States',
    zones: [
      'America/New_York',
      'America/Chicago',
      'America/Denver',
      'America/Los_Angeles',
      'America/Phoenix',
      'America/Anchorage',
      'America/Detroit',
      'America/Indiana/',
      'America/Kentucky/',
      'America/Boise',
      'Pacific/Honolulu',
    ],
    phases: [
      'Single phase, 120/240 V',
      'Three phase, 120/208 V',
      'Three phase, 120/240 V high leg',
      'Three phase, 277/480 V',
    ],
    ...northAmerica,
  },
  europe('ZA', 'South Africa', ['Africa/Johannesburg'], { main: amperes(40, 60, 63, 80) }),
];
