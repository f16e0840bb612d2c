import type { TrueScene } from './true-scene.ts';
import { built, closed, crown, line, ridge } from './true-scene.ts';

const site = (latitude: number, longitude: number, altitude: number, timeZone: string) => ({
  latitude,
  longitude,
  altitude,
  timeZone,
});
const plane = (surfaceTilt: number, surfaceAzimuth: number) => ({
  id: 'plane',
  name: 'Plane',
  surfaceTilt,
  surfaceAzimuth,
});

/** Made-up places: both hemispheres, tropics, high latitude, near and far, built and grown. */
export const SCENES: TrueScene[] = [
  {
    name: 'northern suburb: maple and gable',
    site: site(44.9, -72.2, 270, 'America/New_York'),
    plane: plane(34, 172),
    features: [
      crown('maple', 'deciduous-tree', 205, 22, 36),
      built('gable', 'building', [108, 6], [108, 15], [126, 27], [146, 14], [146, 6]),
      ridge('wooded hill', 'terrain', 0.4, 8, [225, 3], [260, 7], [295, 4]),
    ],
  },
  {
    name: 'southern suburb: gum and two-storey house',
    site: site(-33.9, 151, 40, 'Australia/Sydney'),
    plane: plane(22, 5),
    features: [
      crown('gum', 'evergreen-tree', 322, 20, 44),
      built('house', 'building', [28, 5], [28, 27], [84, 24], [84, 5]),
      ridge('far trees', 'evergreen-tree', 0.8, 6, [250, 5], [280, 10], [305, 7]),
    ],
  },
  {
    name: 'tropics: tower, palms and a low slope',
    site: site(1.3, 103.8, 15, 'Asia/Singapore'),
    plane: plane(10, 95),
    features: [
      built('tower', 'building', [62, 3], [62, 52], [97, 48], [97, 3]),
      crown('palm', 'evergreen-tree', 262, 14, 40),
      built('row', 'building', [270, 3], [270, 20], [330, 24], [330, 3]),
    ],
  },
  {
    name: 'high latitude: spruces and a hill',
    site: site(65, 25.5, 20, 'Europe/Helsinki'),
    plane: plane(55, 180),
    features: [
      ridge('spruces', 'evergreen-tree', 1.5, 4, [128, 4], [140, 13], [170, 10], [190, 15], [215, 5]),
      ridge('hill', 'terrain', 0.3, 10, [220, 3], [265, 8], [310, 3]),
      built('barn', 'building', [80, 2], [80, 12], [104, 10], [104, 2]),
    ],
  },
  {
    name: 'terrace with chimneys, mast and balcony',
    site: site(53.4, -2.2, 60, 'Europe/London'),
    plane: plane(40, 190),
    features: [
      built('left stack', 'chimney', [143, 2], [143, 44], [158, 47], [158, 2]),
      built('right stack', 'chimney', [218, 2], [218, 35], [229, 33], [229, 2]),
      line('mast', 'mast', 0.7, [187, 4], [187, 46]),
      closed('balcony', 'roof-part', [236, 24], [262, 19], [262, 34], [236, 41]),
      built('row opposite', 'building', [95, 6], [140, 9.5], [200, 11], [250, 8]),
    ],
  },
  {
    name: 'valley: full circle of mountains',
    site: site(46.5, 8.1, 950, 'Europe/Zurich'),
    plane: plane(30, 165),
    features: [
      ridge(
        'mountains',
        'terrain',
        0.5,
        9,
        [0, 14],
        [50, 20],
        [95, 27],
        [140, 17],
        [175, 12],
        [215, 22],
        [255, 26],
        [300, 17],
        [360, 14],
      ),
      built('farmhouse', 'building', [118, 4], [118, 30], [138, 34], [138, 4]),
    ],
  },
  {
    name: 'clearing: woods around',
    site: site(45.2, -93.1, 280, 'America/Chicago'),
    plane: plane(30, 160),
    features: [
      ridge(
        'wood',
        'deciduous-tree',
        1.2,
        5,
        [75, 16],
        [110, 38],
        [150, 36],
        [190, 45],
        [235, 40],
        [285, 16],
      ),
      crown('near oak', 'deciduous-tree', 140, 15, 58),
    ],
  },
  {
    name: 'south island: wall near, ranges far',
    site: site(-43.5, 172.6, 20, 'Pacific/Auckland'),
    plane: plane(28, 350),
    features: [
      built('wall', 'roof-part', [32, 1], [32, 20], [78, 16], [78, 1]),
      ridge('ranges', 'terrain', 0.4, 8, [240, 4], [275, 9], [318, 12], [340, 6]),
      line('wire', 'wire', 0.15, [300, 18], [20, 34]),
    ],
  },
  {
    name: 'southern tropics: parapet and tank on a flat roof',
    site: site(-15.4, 28.3, 1200, 'Africa/Lusaka'),
    plane: plane(5, 0),
    features: [
      built('parapet', 'roof-part', [40, 22], [90, 30], [140, 22], [200, 14]),
      built('tank', 'other', [300, 3], [300, 48], [328, 51], [328, 3]),
      crown('mango', 'evergreen-tree', 262, 16, 30),
    ],
  },
  {
    name: 'steep street: houses close by on all sides',
    site: site(37.6, -4.6, 420, 'Europe/Madrid'),
    plane: plane(20, 205),
    features: [
      built('uphill', 'building', [70, 10], [95, 50], [140, 56], [152, 14]),
      built('across', 'building', [152, 14], [165, 50], [212, 55], [222, 20]),
      built('tower', 'building', [236, 5], [236, 60], [262, 54], [262, 5]),
      ridge('hill', 'terrain', 0.4, 10, [262, 9], [290, 14], [330, 8]),
    ],
  },
];
