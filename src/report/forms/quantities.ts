/** Every quantity of the figures, with what it means. */
export const QUANTITIES = {
  // how a plane lies
  'surface-tilt': 'tilt of the plane from the horizontal',
  'surface-azimuth': 'azimuth the plane faces, clockwise from true north',
  'tilt-placings': 'placings of the phone that the tilt was read from',
  'tilt-scatter': 'root mean square departure of the placings from their mean',
  width: 'of the plane along its eave',
  'slope-length': 'of the plane up its slope',
  'outline-corners': 'corners of the outline of the plane',
  area: 'of the plane along its slope',
  'best-tilt': 'tilt of the best-lying plane at the site',
  'best-azimuth': 'azimuth of the best-lying plane at the site',
  'orientation-factor': 'unshaded irradiation on the plane over that on the best-lying plane',

  // light and shade
  'unshaded-irradiation': 'irradiation on the plane with nothing in the way',
  irradiation: 'irradiation on the plane, shade counted',
  'whole-irradiation': 'irradiation on the whole area of the plane, shade counted',
  'solar-access': 'irradiation with obstructions over that without',
  'solar-access-deviation': 'standard deviation of the annual solar access',
  'shading-loss': 'one less the solar access',
  'access-times-orientation': 'solar access times orientation factor',
  'lowest-access': 'lowest annual solar access among the stations of the plane',
  stations: 'stations that the solar access of the plane is the mean of',
  coverage: 'share of the light that comes through azimuths somebody observed',
  'unseen-light': 'share of the light that comes from azimuths nobody observed',

  // what programmes ask for
  'asked-solar-access': 'solar access that is asked for at least',
  'asked-orientation-factor': 'orientation factor that is asked for at least',
  'asked-product': 'solar access times orientation factor that is asked for at least',

  // of obstructions; of a plane the mean over its stations
  distance: 'of the obstruction from the stations',
  transmittance: 'share of the beam that passes the obstruction',
  'gain-if-removed': 'solar access gained if this obstruction goes and the others stay',
  'loss-if-alone': 'solar access lost if this obstruction alone stood',
  'gain-if-all-removed': 'solar access gained if all of a group that hide each other go',
  'gain-if-lower': 'solar access gained with so many metres off the top',
  'gain-if-cut-clear': 'solar access gained with the least cut that takes as good as all of its shade away',
  'loss-if-grown': 'solar access lost with so many metres of growth',
  'light-if-removed': 'irradiation gained if this obstruction goes and the others stay',
  'light-if-lower': 'irradiation gained with so many metres off the top',
  'light-if-cut-clear': 'irradiation gained with the least cut that takes as good as all of its shade away',

  // when an obstruction stands between the sun and the station with the lowest access, taken alone
  'shade-from': 'clock time at which its shade comes, minutes after midnight, summer time included',
  'shade-to': 'clock time at which its shade goes; over 1440 past midnight',
  'shade-first-day': 'first day of a stretch of days with its shade, 1 to 365',
  'shade-last-day': 'last day of a stretch of days with its shade, 1 to 365',
  'shade-longest-day': 'day of the stretch on which its shade lasts longest, 1 to 365',
  'shade-longest': 'how long its shade lasts on that day',

  // field book
  'position-x': 'of the station along the eave of its plane, from the lower left corner looking up the slope',
  'position-y': 'of the station up the slope of its plane',
  'position-east': 'of the station in the local frame',
  'position-north': 'of the station in the local frame',
  'position-up': 'of the station in the local frame',
  'instrument-height': 'of the instrument over the surface at the station',
  'sighting-azimuth': 'of a sighting, clockwise from true north',
  'sighting-elevation': 'of a sighting, as seen, from the horizontal',
  'line-width': 'angular width of a traced line',
  'open-from': 'azimuth from which on, clockwise, the horizon was seen open',
  'open-to': 'azimuth to which the horizon was seen open',

  // what ties a run to true north and to the horizontal
  'heading-correction': 'added to the azimuths of the run',
  'heading-deviation': 'standard deviation of that correction',
  'check-correction': 'correction that one heading check found',
  'check-deviation': 'standard deviation of what the check found',
  'check-against-compass': 'what the check found less the compass',
  'closure-azimuth': 'error of closure: the mark sighted last less first',
  'closure-elevation': 'error of closure: the mark sighted last less first',
  'closure-minutes': 'between the first and the last sighting of the mark',
  'camera-index': 'correction of elevations sighted with the camera',
  'camera-index-deviation': 'standard deviation of that correction',
  'top-edge-index': 'correction of elevations sighted along the top edge',
  'top-edge-index-deviation': 'standard deviation of that correction',
} as const;

export type Quantity = keyof typeof QUANTITIES;
