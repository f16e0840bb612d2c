/** The one file of the package that evaluates a field model; its data files are imported beside it. */
declare module 'geomagnetism/lib/model.js' {
  interface FieldCoefficients {
    epoch: number;
    n_max: number;
    main_field_coeff_g: number[];
    main_field_coeff_h: number[];
  }

  export default class Model {
    constructor(coefficients: FieldCoefficients);
    /** Latitude and longitude in degrees, height over the ellipsoid in km; field in nT and degrees. */
    point(place: [latitude: number, longitude: number, heightKm: number]): {
      decl: number;
      incl: number;
      h: number;
    };
  }
}
