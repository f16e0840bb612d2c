/** One thing to know of a site, with the answers that are usual; any other may be written. */
export interface FactRow {
  id: string;
  label: string;
  choices: readonly string[];
  /** What is shown for some of the answers in place of what is recorded. */
  labels?: Readonly<Record<string, string>>;
  /** Several answers may hold at once. */
  several?: boolean;
  hint?: string;
}

export type FactGroupId = 'roof' | 'access' | 'electrical';

export interface FactGroup {
  id: FactGroupId;
  label: string;
  rows: readonly FactRow[];
}

/** What to know of the roof and its carrying parts. Common practice, no source. */
export const ROOF_FACTS: readonly FactRow[] = [
  {
    id: 'roof-covering',
    label: 'Covering',
    choices: [
      'Concrete tiles',
      'Clay tiles',
      'Slate',
      'Fibre cement',
      'Asphalt shingles',
      'Wood shingles',
      'Standing-seam metal',
      'Trapezoidal metal sheet',
      'Corrugated metal sheet',
      'Sandwich panels',
      'Bitumen sheet',
      'Plastic sheet',
      'Gravel',
      'Green roof',
    ],
    hint: 'Where fibre cement may hold asbestos, leave it untouched and have it tested.',
  },
  {
    id: 'roof-age',
    label: 'Age of the covering',
    choices: [
      'Under 5 years',
      '5 to 10 years',
      '10 to 20 years',
      '20 to 30 years',
      'Over 30 years',
      'Unknown',
    ],
  },
  {
    id: 'roof-condition',
    label: 'Condition',
    several: true,
    choices: [
      'Sound',
      'Broken or slipped pieces',
      'Moss',
      'Rust',
      'Soft or sagging',
      'Leaks told of',
      'To be renewed soon',
    ],
  },
  {
    id: 'rafter-spacing',
    label: 'Rafters, centre to centre',
    choices: ['40 cm', '60 cm', '70 cm', '80 cm', '90 cm', '16 in', '24 in', 'Not seen'],
  },
  {
    id: 'rafter-size',
    label: 'Rafters, width by height',
    choices: ['Not seen'],
    hint: 'Such as 8 × 16 cm, or 2 × 6 in.',
  },
  {
    id: 'roof-structure',
    label: 'What carries the roof',
    choices: ['Rafters', 'Trusses', 'Purlins', 'Concrete slab', 'Steel frame', 'Not seen'],
    hint: 'Whether it carries the array is for a structural engineer to say.',
  },
  {
    id: 'gutter-height',
    label: 'Height of the eave',
    choices: ['Under 3 m', '3 to 6 m', '6 to 10 m', 'Over 10 m'],
  },
];

/** What to know of getting there and of what may hurt somebody. Common practice, no source. */
export const ACCESS_FACTS: readonly FactRow[] = [
  {
    id: 'access',
    label: 'Access to the roof',
    several: true,
    choices: ['Ladder', 'Scaffold needed', 'Lift needed', 'Skylight', 'Roof hatch', 'Stairs'],
  },
  {
    id: 'ground',
    label: 'Ground at the foot',
    several: true,
    choices: ['Level and firm', 'Soft', 'Sloping', 'Narrow', 'Public pavement', 'Glass or plants below'],
  },
  {
    id: 'delivery',
    label: 'Delivery',
    several: true,
    choices: ['Lorry up to the house', 'Small van only', 'Crane has room', 'Permit needed in the street'],
  },
  {
    id: 'hazards',
    label: 'Hazards',
    several: true,
    choices: [
      'Overhead line near the roof',
      'Fragile covering',
      'Skylights',
      'May hold asbestos',
      'Wasps or bees',
      'Dog',
      'Steep over 45°',
      'No place to tie off',
      'Slippery',
    ],
  },
  {
    id: 'protection',
    label: 'Heritage or planning rules',
    choices: ['None known', 'Listed building', 'Conservation area', 'Owners’ association', 'To be asked'],
  },
];
