import type { HoleCard } from '../fit-check/card-fields.js';

const NO_FLAGS = { critical: false, controlSurface: false, fuelWet: false, pressurised: false, crack: false };

/** Two holes 0.0200 apart, square to the edges: one edge lies toward the new centre, one away from it. AD3. */
export function cardA(): HoleCard {
  return {
    layers: [
      {
        name: 'flange',
        alloy: '2024-T3 clad',
        thickness: 0.025,
        hole: { shape: 'round', diameter: 0.098 },
        offset: { x: 0, y: 0 },
        edges: [{ distance: 0.2, angle: 90 }],
        bends: [],
        finish: 'primed',
      },
      {
        name: 'skin',
        alloy: '2024-T3 clad',
        thickness: 0.032,
        hole: { shape: 'round', diameter: 0.098 },
        offset: { x: 0, y: 0.02 },
        edges: [{ distance: 0.21, angle: 90 }],
        bends: [],
        finish: 'primed',
      },
    ],
    rivet: { head: 'universal', alloy: 'AD', dash: 3 },
    neighbours: [{ x: 0.75, y: 0, dash: 3 }],
    group: { count: 1, oversize: 0, adjacentOversize: 0 },
    flags: NO_FLAGS,
    access: 'both',
  };
}

/** One of six AD4 becomes AD5: the skin's hole is drawn out along the row to 0.1500, away from the rib's. */
export function cardB(): HoleCard {
  return {
    layers: [
      {
        name: 'rib',
        alloy: '2024-T3 clad',
        thickness: 0.04,
        hole: { shape: 'round', diameter: 0.1285 },
        offset: { x: 0, y: 0 },
        edges: [{ distance: 0.32, angle: 270 }],
        bends: [],
        finish: 'primed',
      },
      {
        name: 'skin',
        alloy: '2024-T3 clad',
        thickness: 0.032,
        hole: { shape: 'oblong', width: 0.1285, length: 0.15, angle: 0 },
        offset: { x: 0.01075, y: 0 },
        edges: [{ distance: 0.32, angle: 270 }],
        bends: [],
        finish: 'primed',
      },
    ],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: [{ x: 0.9, y: 0, dash: 4 }],
    group: { count: 6, oversize: 0, adjacentOversize: 0 },
    flags: NO_FLAGS,
    access: 'both',
  };
}

/** A hole of the doubler 0.027 toward the doubler's edge from the spar's. */
export function doublerCard(): HoleCard {
  return {
    layers: [
      {
        name: 'spar',
        alloy: '2024-T3 clad',
        thickness: 0.04,
        hole: { shape: 'round', diameter: 0.1285 },
        offset: { x: 0, y: 0 },
        edges: [{ distance: { value: 0.41, u: 0.005 }, angle: 270 }],
        bends: [],
        finish: 'primed',
      },
      {
        name: 'doubler',
        alloy: '2024-T3 clad',
        thickness: 0.063,
        hole: { shape: 'round', diameter: 0.1285 },
        offset: { x: 0, y: { value: 0.027, u: 0.002 } },
        edges: [{ distance: { value: 0.322, u: 0.005 }, angle: 90 }],
        bends: [],
        finish: 'primed',
      },
    ],
    rivet: { head: 'universal', alloy: 'AD', dash: 4 },
    neighbours: [
      { x: -0.61, y: 0, dash: 4 },
      { x: 0.64, y: 0, dash: 4 },
    ],
    group: { count: 22, oversize: 0, adjacentOversize: 0 },
    flags: NO_FLAGS,
    access: 'both',
  };
}
