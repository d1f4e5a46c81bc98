/**
 * Check values worked by hand from published documents, by the source ids of `trade/sources.ts`. `basis` says whether
 * the expected value was read in the document, derived from a rule or table that was, or rests on memory.
 * Inch, pound-force, ksi, psi, inch-pound, degrees.
 */

export const RIVET_LENGTHS = [
  {
    id: 'rivet_length-01',
    input: { layers: [0.032, 0.032], dash: 3 },
    expected: { length: 0.2046, dashRoundedUp: 4, dashNearestHalf: 3.5 },
    source: 'S3 L=1.5D+G; S12 next standard length up; S1 half sizes',
    basis: 'derived',
  },
  {
    id: 'rivet_length-04',
    input: { layers: [0.032, 0.063], dash: 4 },
    expected: { length: 0.2825, dashRoundedUp: 5, dashNearestHalf: 4.5 },
    source: 'S3 L=1.5D+G; S12 next standard length up; S1 half sizes',
    basis: 'derived',
  },
  {
    id: 'rivet_length-05',
    input: { layers: [0.05, 0.05], dash: 5 },
    expected: { length: 0.3344, dashRoundedUp: 6, dashNearestHalf: 5.5 },
    source: 'S3 L=1.5D+G; S12 next standard length up; S1 half sizes',
    basis: 'derived',
  },
  {
    id: 'rivet_length-08',
    input: { layers: [0.02, 0.02], dash: 3 },
    expected: { length: 0.1806, dashRoundedUp: 3, dashNearestHalf: 3.0 },
    source: 'S3 L=1.5D+G; S12 next standard length up; S1 half sizes',
    basis: 'derived',
  },
  {
    id: 'rivet_length-09',
    input: { layers: [0.063, 0.125], dash: 6 },
    expected: { length: 0.4693, dashRoundedUp: 8, dashNearestHalf: 7.5 },
    source: 'S3 L=1.5D+G; S12 next standard length up; S1 half sizes',
    basis: 'derived',
  },
  {
    id: 'rivet_length-11',
    input: { layers: [0.05, 0.05], dash: 5 },
    expected: { length: 0.334 },
    source: 'S24 (worked there: 0.10+0.234)',
    basis: 'read',
  },
] as const;

export const EDGE_DISTANCES = [
  {
    id: 'edge_distance-02',
    input: { edge: 0.188, dash: 4, head: 'universal' },
    expected: { ratio: 1.504, minimum: 0.25, maximum: 0.5, code: 'below_minimum' },
    source: 'S7 (2D protruding, 2.5D flush, 4D max); S21 (1.5D floor)',
    basis: 'derived',
  },
  {
    id: 'edge_distance-03',
    input: { edge: 0.25, dash: 4, head: 'universal' },
    expected: { ratio: 2.0, minimum: 0.25, maximum: 0.5, code: 'ok' },
    source: 'S7 (2D protruding, 2.5D flush, 4D max); S21 (1.5D floor)',
    basis: 'derived',
  },
  {
    id: 'edge_distance-04',
    input: { edge: 0.25, dash: 4, head: 'flush' },
    expected: { ratio: 2.0, minimum: 0.3125, maximum: 0.5, code: 'below_minimum' },
    source: 'S7 (2D protruding, 2.5D flush, 4D max); S21 (1.5D floor)',
    basis: 'derived',
  },
  {
    id: 'edge_distance-06',
    input: { edge: 0.25, dash: 5, head: 'universal' },
    expected: { ratio: 1.6, minimum: 0.3125, maximum: 0.625, code: 'below_minimum' },
    source: 'S7 (2D protruding, 2.5D flush, 4D max); S21 (1.5D floor)',
    basis: 'derived',
  },
  {
    id: 'edge_distance-09',
    input: { edge: 0.1875, dash: 3, head: 'flush' },
    expected: { ratio: 2.0, minimum: 0.2344, maximum: 0.375, code: 'below_minimum' },
    source: 'S7 (2D protruding, 2.5D flush, 4D max); S21 (1.5D floor)',
    basis: 'derived',
  },
  {
    id: 'edge_distance-10',
    input: { edge: 0.4, dash: 3, head: 'universal' },
    expected: { ratio: 4.267, minimum: 0.1875, maximum: 0.375, code: 'above_maximum' },
    source: 'S7 (2D protruding, 2.5D flush, 4D max); S21 (1.5D floor)',
    basis: 'derived',
  },
] as const;

export const PITCHES = [
  {
    id: 'pitch-01',
    input: { pitch: 0.375, dash: 4 },
    expected: { ratio: 3.0, minimum: 0.375, maximum: 1.25, code: 'tight' },
    source: 'S7, S3 (3D min; 10D max S7)',
    basis: 'derived',
  },
  {
    id: 'pitch-03',
    input: { pitch: 0.75, dash: 4 },
    expected: { ratio: 6.0, minimum: 0.375, maximum: 1.25, code: 'ok' },
    source: 'S7, S3 (3D min; 10D max S7)',
    basis: 'derived',
  },
  {
    id: 'pitch-05',
    input: { pitch: 0.9375, dash: 3 },
    expected: { ratio: 10.0, minimum: 0.2812, maximum: 0.9375, code: 'ok' },
    source: 'S7, S3 (3D min; 10D max S7)',
    basis: 'derived',
  },
  {
    id: 'pitch-06',
    input: { pitch: 0.28125, dash: 3 },
    expected: { ratio: 3.0, minimum: 0.2812, maximum: 0.9375, code: 'tight' },
    source: 'S7, S3 (3D min; 10D max S7)',
    basis: 'derived',
  },
  {
    id: 'pitch-07',
    input: { pitch: 0.45, dash: 5 },
    expected: { ratio: 2.88, minimum: 0.4688, maximum: 1.562, code: 'too_close' },
    source: 'S7, S3 (3D min; 10D max S7)',
    basis: 'derived',
  },
] as const;

export const STRENGTHS = [
  {
    id: 'shear_vs_bearing-01',
    input: { thickness: 0.02, dash: 3, edge: 0.1875, sheet: '2024-T3 clad' },
    expected: {
      edgeRatio: 2.0,
      bearingStress: 121.0,
      bearing: 232.3,
      shear: 217,
      critical: 'shear',
      allowable: 217.0,
      thicknessRatio: 0.2133,
      tabulated: true,
    },
    source: 'bearing S27 (97/121 ksi, linear between e/D 1.5 and 2); shear memory of MIL-HDBK-5 8.1.2(b)',
    basis: 'memory',
  },
  {
    id: 'shear_vs_bearing-05',
    input: { thickness: 0.025, dash: 4, edge: 0.1875, sheet: '2024-T3 clad' },
    expected: {
      edgeRatio: 1.5,
      bearingStress: 97.0,
      bearing: 311.6,
      shear: 388,
      critical: 'bearing',
      allowable: 311.6,
      thicknessRatio: 0.2,
      tabulated: true,
    },
    source: 'bearing S27 (97/121 ksi, linear between e/D 1.5 and 2); shear memory of MIL-HDBK-5 8.1.2(b)',
    basis: 'memory',
  },
  {
    id: 'shear_vs_bearing-06',
    input: { thickness: 0.032, dash: 5, edge: 0.3125, sheet: '2024-T3 clad' },
    expected: {
      edgeRatio: 2.0,
      bearingStress: 121.0,
      bearing: 615.6,
      shear: 596,
      critical: 'shear',
      allowable: 596.0,
      thicknessRatio: 0.2048,
      tabulated: true,
    },
    source: 'bearing S27 (97/121 ksi, linear between e/D 1.5 and 2); shear memory of MIL-HDBK-5 8.1.2(b)',
    basis: 'derived',
  },
  {
    id: 'shear_vs_bearing-07',
    input: { thickness: 0.04, dash: 5, edge: 0.25, sheet: '2024-T3 clad' },
    expected: {
      edgeRatio: 1.6,
      bearingStress: 101.8,
      bearing: 647.4,
      shear: 596,
      critical: 'shear',
      allowable: 596.0,
      thicknessRatio: 0.256,
      tabulated: true,
    },
    source: 'bearing S27 (97/121 ksi, linear between e/D 1.5 and 2); shear memory of MIL-HDBK-5 8.1.2(b)',
    basis: 'derived',
  },
  {
    id: 'shear_vs_bearing-09',
    input: { thickness: 0.016, dash: 3, edge: 0.1875, sheet: '2024-T3 clad' },
    expected: {
      edgeRatio: 2.0,
      bearingStress: 121.0,
      bearing: 185.9,
      shear: 217,
      critical: 'bearing',
      allowable: 185.9,
      thicknessRatio: 0.1707,
      tabulated: false,
    },
    source: 'bearing S27 (97/121 ksi, linear between e/D 1.5 and 2); shear memory of MIL-HDBK-5 8.1.2(b)',
    basis: 'memory',
  },
] as const;

export const SPLICES_COUNTED = [
  {
    id: 'splice_count-01',
    input: { table: '4-10', thickness: 0.032, diameter: '1/8', width: 10, factor: 0.75 },
    expected: { rivets: 37, perInch: 4.9 },
    source: 'S2 (AC 43.13-1B 4-58g)',
    basis: 'read',
  },
  {
    id: 'splice_count-02',
    input: { table: '4-10', thickness: 0.04, diameter: '1/8', width: 0.6, factor: 0.6 },
    expected: { rivets: 3 },
    source: 'S5b (figure 4-20)',
    basis: 'read',
  },
  {
    id: 'splice_count-03',
    input: { table: '4-10', thickness: 0.04, diameter: '1/8', width: 2.0, factor: 0.6 },
    expected: { rivets: 8 },
    source: 'S5b (figure 4-20)',
    basis: 'read',
  },
  {
    id: 'splice_count-06',
    input: { table: '4-10', thickness: 0.051, diameter: '5/32', width: 3, factor: 0.8 },
    expected: { rivets: 13, perInch: 5.1 },
    source: 'S5 Table 4-10; round up',
    basis: 'derived',
  },
  {
    id: 'splice_count-09',
    input: { table: '4-11', thickness: 0.04, diameter: '1/8', width: 8, factor: 0.75 },
    expected: { rivets: 29, perInch: 4.7 },
    source: 'S6 Table 4-11; round up',
    basis: 'derived',
  },
  {
    id: 'splice_count-12',
    input: { table: '4-10', thickness: 0.032, diameter: '1/8', width: 2.0, factor: 0.75 },
    expected: { rivets: 8 },
    source: 'S5 note c; patch split into halves is engine convention',
    basis: 'derived',
  },
] as const;

export const BENDS = [
  {
    id: 'bend-04',
    input: { angle: 90, radius: 0.125, thickness: 0.032 },
    expected: { setback: 0.157, allowance: 0.2186, deduction: 0.09545 },
    source: 'S29, S31b',
    basis: 'derived',
  },
  {
    id: 'bend-08',
    input: { angle: 30, radius: 0.25, thickness: 0.063 },
    expected: { setback: 0.08387, allowance: 0.1455, deduction: 0.02227 },
    source: 'S29, S31b',
    basis: 'derived',
  },
] as const;

export const COUNTERSINKS = [
  {
    id: 'countersink_vs_dimple-01',
    input: { thickness: 0.032, dash: 3 },
    expected: { code: 'knife_edge', minimum: 0.04, headHeight: 0.036 },
    source: 'S11 table 4; S25 dimple to 0.040; head height memory',
    basis: 'derived',
  },
  {
    id: 'countersink_vs_dimple-03',
    input: { thickness: 0.04, dash: 4 },
    expected: { code: 'knife_edge', minimum: 0.05, headHeight: 0.042 },
    source: 'S11 table 4; S25 dimple to 0.040; head height memory',
    basis: 'derived',
  },
  {
    id: 'countersink_vs_dimple-07',
    input: { thickness: 0.071, dash: 6 },
    expected: { code: 'between', minimum: 0.072, headHeight: 0.07 },
    source: 'S11 table 4; S25 dimple to 0.040; head height memory',
    basis: 'derived',
  },
  {
    id: 'countersink_vs_dimple-08',
    input: { thickness: 0.063, dash: 4 },
    expected: { code: 'countersink_ok', minimum: 0.05, headHeight: 0.042 },
    source: 'S11 table 4; S25 dimple to 0.040; head height memory',
    basis: 'derived',
  },
] as const;

export const RIVET_DRILLS = [
  {
    id: 'drill_for_rivet-01',
    input: { dash: 3 },
    expected: { nominalHole: 0.096, drill: '#41', clearance: 0.00225 },
    source: 'holes proved by S4-S6 arithmetic; drill sizes S20',
    basis: 'derived',
  },
  {
    id: 'drill_for_rivet-02',
    input: { dash: 4 },
    expected: { nominalHole: 0.1285, drill: '#30', clearance: 0.0035 },
    source: 'holes proved by S4-S6 arithmetic; drill sizes S20',
    basis: 'derived',
  },
  {
    id: 'drill_for_rivet-03',
    input: { dash: 5 },
    expected: { nominalHole: 0.159, drill: '#21', clearance: 0.00275 },
    source: 'holes proved by S4-S6 arithmetic; drill sizes S20',
    basis: 'derived',
  },
] as const;

export const TORQUES = [
  {
    id: 'torque-01',
    input: { thread: '10-32', nut: 'tension' },
    expected: { minimum: 20, maximum: 25 },
    source: 'S36 Table 7-1',
    basis: 'read',
  },
  {
    id: 'torque-02',
    input: { thread: '1/4-28', nut: 'shear' },
    expected: { minimum: 30, maximum: 40 },
    source: 'S36 Table 7-1',
    basis: 'read',
  },
  {
    id: 'torque-07',
    input: { thread: '1/4-28', nut: 'tension', drag: 5 },
    expected: { minimum: 55, maximum: 75 },
    source: 'S37 f: do not exceed maximum (recommended) plus drag',
    basis: 'derived',
  },
] as const;

export const TWO_HOLES = [
  {
    id: 'fit_two_holes-01',
    input: { diameter1: 0.098, diameter2: 0.098, offset: 0.02 },
    expected: {
      minimumDiameter: 0.118,
      dash: 4,
      drill: '#30',
      shift1: 0.01,
      shift2: 0.01,
      oneInsideOther: false,
      finalDiameter: 0.1285,
      slack: 0.0105,
    },
    source: 'geometry; drills S20; shop-final holes',
    basis: 'derived',
  },
  {
    id: 'fit_two_holes-03',
    input: { diameter1: 0.1285, diameter2: 0.1285, offset: 0.015 },
    expected: {
      minimumDiameter: 0.1435,
      dash: 5,
      drill: '#21',
      shift1: 0.0075,
      shift2: 0.0075,
      oneInsideOther: false,
      finalDiameter: 0.159,
      slack: 0.0155,
    },
    source: 'geometry; drills S20; shop-final holes',
    basis: 'derived',
  },
  {
    id: 'fit_two_holes-04',
    input: { diameter1: 0.098, diameter2: 0.1285, offset: 0.01 },
    expected: {
      minimumDiameter: 0.1285,
      dash: 4,
      drill: '#30',
      shift1: 0.01,
      shift2: 0.0,
      oneInsideOther: true,
      finalDiameter: 0.1285,
      slack: 0.0,
    },
    source: 'geometry; drills S20; shop-final holes',
    basis: 'derived',
  },
  {
    id: 'fit_two_holes-06',
    input: { diameter1: 0.1285, diameter2: 0.159, offset: 0.03 },
    expected: {
      minimumDiameter: 0.1737,
      dash: 6,
      drill: '#11',
      shift1: 0.02262,
      shift2: 0.007375,
      oneInsideOther: false,
      finalDiameter: 0.191,
      slack: 0.01725,
    },
    source: 'geometry; drills S20; shop-final holes',
    basis: 'derived',
  },
  {
    id: 'fit_two_holes-10',
    input: { diameter1: 0.098, diameter2: 0.098, offset: 0.018 },
    expected: { minimumDiameter: 0.116, dash: 4, drill: '#30' },
    source: 'geometry: slot = two circles w apart l-w',
    basis: 'derived',
  },
] as const;

export const GROUPS = [
  {
    id: 'group_strength-01',
    input: { count: 5, fromDash: 4, toDash: 5, thickness: 0.04, edge: 0.25, sheet: '2024-T3 clad' },
    expected: { before: 1940.0, after: 2148.0, percent: 110.7 },
    source: 'S27; shear memory',
    basis: 'memory',
  },
] as const;

export const BUCKLINGS = [
  {
    id: 'inter_rivet_buckling-01',
    input: { fixity: 1.5, thickness: 0.025, spacing: 1.25, modulus: 10700000.0 },
    expected: { stress: 5280.0, elastic: true },
    source: 'S46 formula (eta=1); Ec S27',
    basis: 'derived',
  },
  {
    id: 'inter_rivet_buckling-02',
    input: { fixity: 3.0, thickness: 0.025, spacing: 1.25, modulus: 10700000.0 },
    expected: { stress: 10560.0, elastic: true },
    source: 'S46 formula (eta=1); Ec S27',
    basis: 'derived',
  },
] as const;

export const DRIVEN_HEADS = [
  {
    id: 'driven_head-01',
    input: { width: 0.188, height: 0.063, dash: 4 },
    expected: { widthRatio: 1.504, heightRatio: 0.504, code: 'ok' },
    source: 'S9 minima 1.3D/0.3D; nominal 1.5D x 0.5D S13/S19; 1.4D/0.4D advisory band is engine default',
    basis: 'derived',
  },
  {
    id: 'driven_head-03',
    input: { width: 0.155, height: 0.07, dash: 4 },
    expected: { widthRatio: 1.24, heightRatio: 0.56, code: 'reject' },
    source: 'S9 minima 1.3D/0.3D; nominal 1.5D x 0.5D S13/S19; 1.4D/0.4D advisory band is engine default',
    basis: 'derived',
  },
  {
    id: 'driven_head-07',
    input: { width: 0.215, height: 0.045, dash: 4 },
    expected: { widthRatio: 1.72, heightRatio: 0.36, code: 'overdriven' },
    source: 'S9 minima 1.3D/0.3D; nominal 1.5D x 0.5D S13/S19; 1.4D/0.4D advisory band is engine default',
    basis: 'derived',
  },
] as const;
