/**
 * The bibliography. A number in the house points here by key, so a wrong key does not compile.
 *
 * status: 'read' = the text was seen; 'secondary' = seen as quoted elsewhere; 'memory' = not confirmed; 'derived' = worked
 * out by us; 'judgement' = our choice.
 */
export type SourceStatus = 'read' | 'secondary' | 'memory' | 'derived' | 'judgement';

export interface Reference {
  readonly title: string;
  readonly status: SourceStatus;
}

function entries<K extends string>(list: Record<K, Reference>): Readonly<Record<K, Reference>> {
  return list;
}

export const references = entries({
  SI9: { title: 'BIPM, The International System of Units, 9th edition, 2019', status: 'memory' },
  Icao5: { title: 'ICAO Annex 5, Units of Measurement to be Used in Air and Ground Operations', status: 'memory' },
  Rfc6901: { title: 'RFC 6901, JavaScript Object Notation (JSON) Pointer, 2013', status: 'memory' },
  Rfc4180: { title: 'RFC 4180, Common Format and MIME Type for Comma-Separated Values, 2005', status: 'memory' },
  Rfc7396: { title: 'RFC 7396, JSON Merge Patch, 2014', status: 'memory' },
  Rfc8259: { title: 'RFC 8259, The JavaScript Object Notation (JSON) Data Interchange Format, 2017', status: 'memory' },
  Rfc9110: { title: 'RFC 9110, HTTP Semantics, 2022', status: 'memory' },
  Rfc9457: { title: 'RFC 9457, Problem Details for HTTP APIs, 2023', status: 'memory' },
  Iso2533: { title: 'ISO 2533:1975, Standard Atmosphere', status: 'read' },
  Iso2533Add2: {
    title: 'ISO 2533:1975/Add 2:1997, extension of the standard atmosphere to -5000 m',
    status: 'memory',
  },
  Wmo8: { title: 'WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B', status: 'secondary' },
  Cipm2007: {
    title: 'Picard et al., CIPM-2007 formula for the density of moist air, Metrologia 45 (2008)',
    status: 'secondary',
  },
  Cfr25s101: { title: '14 CFR 25.101(b), standard humidity and its table', status: 'read' },
  Amendment25n108: { title: '14 CFR Part 25, Amendment 25-108, 1-g stall speed as the basis (2002)', status: 'memory' },
  Cfr25s103: { title: '14 CFR 25.103, stall speed', status: 'secondary' },
  Cfr1s1: { title: '14 CFR 1.1, definitions (calibrated, equivalent, true airspeed)', status: 'memory' },
  GraceyRp1046: { title: 'Gracey, Measurement of Aircraft Speed and Altitude, NASA RP-1046, 1980', status: 'memory' },
  Phak: { title: "FAA-H-8083-25, Pilot's Handbook of Aeronautical Knowledge", status: 'read' },
  AndersonIntroduction: { title: 'Anderson, Introduction to Flight, 6th edition', status: 'secondary' },
  EuAirOps100: {
    title: 'Regulation (EU) No 965/2012, CAT.POL.A.100, performance classes of aeroplanes',
    status: 'memory',
  },
  EuAirOps205: { title: 'Regulation (EU) No 965/2012, CAT.POL.A.205, take-off of class A aeroplanes', status: 'read' },
  EuAirOps210: {
    title: 'Regulation (EU) No 965/2012, CAT.POL.A.210, take-off obstacle clearance of class A',
    status: 'read',
  },
  EuAirOps230: {
    title: 'Regulation (EU) No 965/2012, CAT.POL.A.230 with GM2, landing of class A on dry runways',
    status: 'read',
  },
  EuAirOps235: {
    title: 'Regulation (EU) No 965/2012, CAT.POL.A.235, landing of class A on wet runways',
    status: 'read',
  },
  EuOps1s520: {
    title: 'Regulation (EC) No 859/2008 (EU-OPS), OPS 1.520(b), landing on contaminated runways',
    status: 'secondary',
  },
  EuAirOps303: {
    title: 'Regulation (EU) No 965/2012, CAT.OP.MPA.303, landing distance at the time of arrival',
    status: 'read',
  },
  EuAirOps305: { title: 'Regulation (EU) No 965/2012, CAT.POL.A.305, take-off of class B aeroplanes', status: 'read' },
  EuAirOps305Amc1: {
    title: 'AMC1 CAT.POL.A.305, runway surface condition, Table 1 (ED Decision 2014/015/R)',
    status: 'secondary',
  },
  EuAirOps305Amc2: { title: 'AMC2 CAT.POL.A.305, runway slope (ED Decision 2014/015/R)', status: 'read' },
  EuAirOps310: {
    title: 'Regulation (EU) No 965/2012, CAT.POL.A.310, take-off obstacle clearance, multi-engined class B aeroplanes',
    status: 'read',
  },
  EuAirOps330: { title: 'Regulation (EU) No 965/2012, CAT.POL.A.330, landing of class B aeroplanes', status: 'read' },
  EuAirOps330Amc1: { title: 'AMC1 CAT.POL.A.330, landing on grass (ED Decision 2014/015/R)', status: 'secondary' },
  EuAirOps330Amc2: {
    title: 'AMC2 CAT.POL.A.330, runway slope on landing (ED Decision 2014/015/R)',
    status: 'secondary',
  },
  EuAirOps335: {
    title: 'Regulation (EU) No 965/2012, CAT.POL.A.335, landing of class B aeroplanes on wet runways',
    status: 'read',
  },
  EuAirOps335Gm1: { title: 'GM1 CAT.POL.A.335(a), landing on wet grass (ED Decision 2014/015/R)', status: 'read' },
  EuAirOps340: { title: 'Regulation (EU) No 965/2012, CAT.POL.A.340, climb of class B aeroplanes', status: 'read' },
  EuAirOps400: { title: 'Regulation (EU) No 965/2012, CAT.POL.A.400, take-off of class C aeroplanes', status: 'read' },
  EuAirOps430: {
    title: 'Regulation (EU) No 965/2012, CAT.POL.A.430 and .435, landing of class C aeroplanes',
    status: 'read',
  },
  Cfr91s103: { title: '14 CFR 91.103, preflight action', status: 'memory' },
  Cfr91s605: { title: '14 CFR 91.605, weight limitations of transport category aeroplanes', status: 'memory' },
  Cfr91s1037: { title: '14 CFR 91.1037, landing limitations of fractional ownership', status: 'read' },
  Cfr121s177: { title: '14 CFR 121.177(b), wind in takeoff limitations', status: 'read' },
  Cfr121s189: { title: '14 CFR 121.189, takeoff limitations of turbine aeroplanes', status: 'memory' },
  Cfr121s195: { title: '14 CFR 121.195(b), landing limitations of turbine aeroplanes, destination', status: 'read' },
  Cfr121s195d: { title: '14 CFR 121.195(d), wet or slippery destination of turbojets', status: 'secondary' },
  Cfr121s197: { title: '14 CFR 121.195(c) and 121.197, landing limitations with and at alternates', status: 'memory' },
  Cfr135s367: { title: '14 CFR 135.367(b), wind in takeoff limitations', status: 'read' },
  Cfr135s375: {
    title: '14 CFR 135.375, landing limitations of large transport reciprocating aeroplanes, destination',
    status: 'memory',
  },
  Cfr135s377: { title: '14 CFR 135.377, landing limitations of the same at alternates', status: 'read' },
  Cfr135s379: { title: '14 CFR 135.379, takeoff limitations of large transport turbine aeroplanes', status: 'read' },
  Cfr135s385: {
    title: '14 CFR 135.385, landing limitations of large transport turbine aeroplanes, destination',
    status: 'read',
  },
  Cfr135s387: { title: '14 CFR 135.387, landing limitations of the same at alternates', status: 'read' },
  Cfr135s389: { title: '14 CFR 135.389, takeoff limitations of large nontransport aeroplanes', status: 'read' },
  Cfr135s393: { title: '14 CFR 135.393, landing limitations of the same, destination', status: 'memory' },
  Cfr135s395: { title: '14 CFR 135.395, landing limitations of the same at alternates', status: 'read' },
  Cfr135s398: { title: '14 CFR 135.398, performance limitations of commuter category aeroplanes', status: 'memory' },
  Cfr135s399: { title: '14 CFR 135.399, performance limitations of small nontransport aeroplanes', status: 'read' },
  Safo19001: { title: 'FAA SAFO 19001, landing distance factors by runway condition code', status: 'secondary' },
  Safo06012: { title: 'FAA SAFO 06012, landing performance at the time of arrival, 2006', status: 'read' },
  UkSafetySense: {
    title: 'UK CAA Safety Sense leaflet, aeroplane performance, table of factors',
    status: 'secondary',
  },
  UkAic67s2002: {
    title: 'UK AIC 67/2002, take-off, climb and landing performance of light aeroplanes',
    status: 'secondary',
  },
  OperatorsOwn: { title: "The operator's own figure, as given in the question", status: 'judgement' },
  Wmo306: {
    title:
      'WMO-No. 306, Manual on Codes, FM 15 METAR, regulations 15.5 (wind), 15.11 (temperature) and 15.12 (pressure)',
    status: 'read',
  },
  Afman15s111: { title: 'AFMAN 15-111, Surface Weather Observations, 2019, 3.10 (altimeter setting)', status: 'read' },
  FaaJo7900: {
    title: 'FAA Order JO 7900.5, Surface Weather Observing, remarks of temperature in tenths',
    status: 'memory',
  },
  Rfc3339: { title: 'RFC 3339, Date and Time on the Internet: Timestamps, 2002', status: 'memory' },
  Cfr25s1501: { title: '14 CFR 25.1501 and 23.1501, operating limitations', status: 'memory' },
  Cfr23s51: { title: '14 CFR 23.51 at amendments 23-50 to 23-62, takeoff speeds', status: 'read' },
  Cfr23s73: { title: '14 CFR 23.73 at amendments 23-50 to 23-62, reference landing approach speed', status: 'read' },
  Cfr23s75: { title: '14 CFR 23.75 at amendments 23-50 to 23-62, landing distance', status: 'read' },
  Cfr23s77: { title: '14 CFR 23.77 at amendments 23-50 to 23-62, balked landing', status: 'read' },
  Cfr23s55: { title: '14 CFR 23.55 at amendments 23-50 to 23-62, accelerate-stop distance', status: 'read' },
  Cfr23s59: {
    title: '14 CFR 23.59 at amendments 23-50 to 23-62, takeoff distance and run of commuters',
    status: 'memory',
  },
  Cfr25s105: { title: '14 CFR 25.105(d)(1), wind in takeoff data', status: 'read' },
  Cfr25s107: { title: '14 CFR 25.107, takeoff speeds', status: 'read' },
  Cfr25s111: { title: '14 CFR 25.111, takeoff path', status: 'read' },
  Cfr25s113: { title: '14 CFR 25.113, takeoff distance and takeoff run', status: 'read' },
  Cfr25s119: { title: '14 CFR 25.119, landing climb, all engines operating', status: 'memory' },
  Cfr25s121: { title: '14 CFR 25.121, climb with one engine inoperative', status: 'read' },
  Cfr25s125: { title: '14 CFR 25.125 and CS 25.125, landing', status: 'read' },
  Cfr23s233: { title: '14 CFR 23.233 and 25.237, crosswind that was demonstrated', status: 'memory' },
  Annex14: { title: 'ICAO Annex 14, Volume I, declared distances, clearways and runway slopes', status: 'memory' },
  SpaEfbAmc5: {
    title:
      'AMC5 SPA.EFB.100(b)(3), performance applications: critical assumptions, unachievable results (ED Decision 2019/008/R)',
    status: 'read',
  },
  HouseEngineOutDrag: {
    title: 'Drag of a dead engine and of the rudder that holds it, class figures after Raymer',
    status: 'memory',
  },
  Judgement: { title: 'A choice made for this service where no public source decides', status: 'judgement' },
  AbramowitzStegun: { title: 'Abramowitz & Stegun, Handbook of Mathematical Functions, 1964', status: 'memory' },
  GolubVanLoan: { title: 'Golub & Van Loan, Matrix Computations, 3rd edition', status: 'memory' },
  HollandWelsch1977: {
    title: 'Holland & Welsch, Robust Regression Using Iteratively Reweighted Least-Squares, Comm. Statist. A6 (1977)',
    status: 'memory',
  },
  Atkinson1992: { title: 'Atkinson & Donev, Optimum Experimental Designs, 1992', status: 'memory' },
  Marquardt1963: {
    title: 'Marquardt, An Algorithm for Least-Squares Estimation of Nonlinear Parameters, J. SIAM 11 (1963)',
    status: 'memory',
  },
  More1978: {
    title: 'More, The Levenberg-Marquardt Algorithm: Implementation and Theory, Springer LNM 630 (1978)',
    status: 'memory',
  },
  Brent1973: { title: 'Brent, Algorithms for Minimization without Derivatives, 1973', status: 'memory' },
  Wieselsberger1922: { title: 'Wieselsberger, Wing Resistance near the Ground, NACA TM 77, 1922', status: 'secondary' },
  Lowry1995: {
    title: 'Lowry, The Bootstrap Approach to Predicting Airplane Flight Performance, JAAER 6(1), 1995',
    status: 'secondary',
  },
  GaggFerrar1934: {
    title: 'Gagg & Ferrar, Altitude Performance of Aircraft Engines Equipped with Gear-Driven Superchargers, SAE, 1934',
    status: 'secondary',
  },
  McCormick1995: {
    title: 'McCormick, Aerodynamics, Aeronautics, and Flight Mechanics, 2nd edition',
    status: 'secondary',
  },
  Torenbeek1982: { title: 'Torenbeek, Synthesis of Subsonic Airplane Design', status: 'memory' },
  Mattingly2002: { title: 'Mattingly, Heiser & Pratt, Aircraft Engine Design, 2nd edition, 2002', status: 'secondary' },
  GudmundssonGa: { title: 'Gudmundsson, General Aviation Aircraft Design', status: 'secondary' },
  PerkinsHage1949: { title: 'Perkins & Hage, Airplane Performance, Stability and Control, 1949', status: 'secondary' },
  KrenkelSalzman1968: {
    title: 'Krenkel & Salzman, take-off performance, Journal of Aircraft, 1968',
    status: 'secondary',
  },
  Raymer: { title: 'Raymer, Aircraft Design: A Conceptual Approach, ch. 17', status: 'secondary' },
  AndersonPerformance: { title: 'Anderson, Aircraft Performance and Design, 1999, ch. 6', status: 'read' },
  Cfr25s109a: { title: '14 CFR 25.109(a) and (b), accelerate-stop distance', status: 'read' },
  Cfr25s109Before1998: {
    title: '14 CFR 25.109 before amendment 25-92, accelerate-stop distance',
    status: 'memory',
  },
  Cfr25s109: {
    title: '14 CFR 25.109(c), wet runway braking coefficient and anti-skid efficiency',
    status: 'secondary',
  },
  Ac25s32: { title: 'FAA AC 25-32, Landing Performance Data for Time-of-Arrival Assessments, 2015', status: 'memory' },
  Ac25s31: {
    title: 'FAA AC 25-31, Takeoff Performance Data for Operations on Contaminated Runways, 2015, table 2',
    status: 'secondary',
  },
  Amc25s1591: {
    title: 'AMC 25.1591, contaminated runways: displacement and spray drag, densities (3 mm read, the rest recalled)',
    status: 'memory',
  },
  Rcam: {
    title: 'Runway condition assessment matrix of the global reporting format, FAA AIM and ICAO Doc 10064',
    status: 'secondary',
  },
  HorneDreher1963: {
    title: 'Horne & Dreher, Phenomena of Pneumatic Tire Hydroplaning, NASA TN D-2056, 1963',
    status: 'secondary',
  },
  HorneSpinUp: { title: 'Horne, spin-up hydroplaning speed of a wheel at touchdown', status: 'memory' },
  HouseContaminant: {
    title:
      'Contaminants the longer way: their drag whole in a takeoff, at most half in a stop; the poorer braking figure',
    status: 'judgement',
  },
  HouseManual: {
    title:
      'Flight-manual figures: edges, silences carried by the ratio of two runs of physics, and how far the two may differ',
    status: 'judgement',
  },
  HouseFriction: {
    title: 'Rolling and braking friction by surface: the long-distance end of the published ranges',
    status: 'judgement',
  },
  HousePistonLapse: {
    title: 'Lapse of piston thrust with altitude and temperature, from fits to two published takeoff tables',
    status: 'derived',
  },
  HouseTurbineLapse: {
    title: 'Turboprop power against temperature, low end of the usual reserve',
    status: 'judgement',
  },
  HouseFit: {
    title:
      'Fits of thrust, drag, lapses and braking to published tables: bounds, priors and weights tried on two of them',
    status: 'derived',
  },
  HouseThrustFactor: {
    title: "Thrust factors of propulsion nobody has fitted, held to Torenbeek's mean takeoff thrust",
    status: 'derived',
  },
  HouseEnergyPath: {
    title: 'Airborne path by the energy equation on a stated speed schedule, behind a pull-up arc',
    status: 'derived',
  },
  Fips180: { title: 'NIST FIPS 180-4, Secure Hash Standard, 2015', status: 'memory' },
});

export type ReferenceKey = keyof typeof references;
