/**
 * How a number came here: `read` in the document itself, `part` of which was read, `restated` in another public
 * text, `memory` recalled and never read, `derived` by arithmetic from what was read, `house` a convention of ours.
 */
export type Reading = 'read' | 'part' | 'restated' | 'memory' | 'derived' | 'house';

export interface PublishedSource {
  readonly title: string;
  readonly how: Reading;
}

/** The published documents behind the numbers, by the id that every check names. */
export const SOURCES = {
  S1: {
    title: 'FAA AC 43.13-1B (9/8/98), chapter 4 section 4, para 4-57a(4), 4-57b, page 4-16',
    how: 'read',
  },
  S2: {
    title: 'AC 43.13-1B CHG 1 (9/27/01), 4-58g, h, i, page 4-27 (worked splice: 37 rivets)',
    how: 'read',
  },
  S2b: { title: 'AC 43.13-1B 4-58j to m, page 4-36', how: 'part' },
  S2c: { title: 'AC 43.13-1B 4-58 introduction, page 4-25', how: 'read' },
  S2d: { title: 'AC 43.13-1B 4-57f(8), (9), 4-57g, page 4-24', how: 'part' },
  S2e: {
    title:
      'AC 43.13-1B page 4-12 (no oversize holes in spar caps, longitudinal stringers, highly stressed tension members; removing rivets)',
    how: 'part',
  },
  S3: { title: 'NAVEDTRA 14018 chapter 13, spacing and edge distance, rivet length', how: 'part' },
  S3b: { title: 'NAVEDTRA 14018 chapter 13, rivet selection rules', how: 'part' },
  S3c: { title: 'NAVEDTRA 14018 chapter 13, drilling rivet holes', how: 'part' },
  S4: { title: 'AC 43.13-1B Table 4-9, page 4-37 (column order rebuilt from scrambled text)', how: 'part' },
  S5: { title: 'AC 43.13-1B Table 4-10, page 4-38', how: 'read' },
  S5b: { title: 'AC 43.13-1B figure 4-20, page 4-41 (worked frame splice: 3 and 8 rivets)', how: 'read' },
  S6: { title: 'AC 43.13-1B Table 4-11, page 4-39', how: 'read' },
  S7: { title: 'US Army subcourse AL0992, rivet selection, spacing and edge distance', how: 'read' },
  S8: { title: 'MIL-R-47196A (6 Sep 1977), drilling, burrs, oversize, repair limits', how: 'restated' },
  S9: { title: 'MIL-HDBK-5H (1 Dec 1998) section 8.1.2, page 8-9', how: 'part' },
  S10: { title: 'FAA-H-8083-31 volume 1 chapter 4, installation of rivets', how: 'part' },
  S11: { title: 'TM 9-2320-363-34-2, tables 3 and 4 (100-degree countersink)', how: 'read' },
  S12: { title: 'TM 10-5410-229-13&P, para 5-6', how: 'read' },
  S13: { title: 'a 1940s military aircraft repair manual, paras 8 to 10, 14 to 16 (historic)', how: 'part' },
  S14: { title: 'TM 9-2320-303-24-2, WP 0289, tables 5 and 6', how: 'read' },
  S15: { title: 'TM 10-5410-221-14, table 4-3 (blind rivets; feeler)', how: 'read' },
  S16: { title: 'TM 9-2320-387-24-2, para 10-56', how: 'part' },
  S17: { title: 'a general rivet-sizing note (dash = 1/32 in diameter, 1/16 in length)', how: 'part' },
  S18: {
    title: 'public study notes on FAA handbook material (head marks, shop head 1.5 D x 0.5 D)',
    how: 'restated',
  },
  S19: {
    title: 'public study notes on FAA handbook material (head marks, shop head 1.5 D x 0.5 D)',
    how: 'restated',
  },
  S20: {
    title: 'ANSI/ASME B94.11M twist-drill series, as two unrelated public codes restate it',
    how: 'restated',
  },
  S21: { title: 'NASA RP-1228, Fastener Design Manual (Mar 1990), pages 21, 34', how: 'restated' },
  S22: { title: 'a trade-press review of riveting practice (Mar 1999)', how: 'part' },
  S23: { title: 'a stress article citing MMPDS-09 Tables 8.1.2(b), 3.2.4.0(e1)', how: 'restated' },
  S24: { title: 'a technical note on rivet sizing (head 1.4 D, 0.3 D)', how: 'part' },
  S25: { title: 'FAA AC 65-15A chapter 5, countersinking and dimpling', how: 'restated' },
  S26: { title: 'an engineers’ discussion of edge-distance practice', how: 'part' },
  S27: { title: 'clad 2024 sheet to QQ-A-250/5, a design textbook’s Table 19.1', how: 'restated' },
  S28: { title: 'public code with MIL-HDBK-5 values (one clear error in it)', how: 'restated' },
  S29: { title: 'FAA-H-8083-31 volume 1 chapter 4, U-channel layout', how: 'part' },
  S30: { title: 'NAVEDTRA 14018 chapter 13, bend allowance', how: 'read' },
  S31b: { title: 'FAA handbook bend-allowance constant (0.01743 R + 0.0078 T) per degree', how: 'restated' },
  S32: { title: 'bend radii of 2024-T3 by thickness (0.064: 3 t to 5 t, as Table 4-6)', how: 'restated' },
  S33: { title: 'bend radii of 2024-T3 by thickness (0.064: 3 t to 5 t, as Table 4-6)', how: 'restated' },
  S34: { title: 'a general design book’s bend-radius chart', how: 'read' },
  S35: {
    title: 'AC 43.13-1B Table 4-7, K-chart, page 4-15 (176 degrees is misprinted: 26.63 for 28.64)',
    how: 'read',
  },
  S35b: {
    title:
      'AC 43.13-1B Table 4-6, 4-56b(2), (3): setback 0.130 at 45 degrees, 0.758 at 135 degrees for 0.064 with radius 0.25',
    how: 'read',
  },
  S36: { title: 'AC 43.13-1B Table 7-1; para 7-40d to i', how: 'read' },
  S37: { title: 'AC 43.13-1B Table 7-1; para 7-40d to i', how: 'read' },
  S38: { title: 'a general tap and clearance drill chart (ASME B1.1 threads)', how: 'read' },
  S39: { title: 'AMS-S-8802 classes; AMS-S-8802D scope', how: 'restated' },
  S40: { title: 'NAVEDTRA 14315 chapter 5, MIL-S-8802 sealants', how: 'part' },
  S43: { title: 'NAVEDTRA 14315 chapter 5, MIL-S-8802 sealants', how: 'part' },
  S42: { title: 'a class B sealant data sheet’s test condition (77 F, 50 % RH, 14 days)', how: 'part' },
  S44: { title: 'TO 1-1-700 chapter 12', how: 'part' },
  S45: { title: 'TM 1-1500-204-23-6, 6-1a, 6-1d', how: 'part' },
  S46: { title: 'a stress reference on inter-rivet buckling', how: 'read' },
  S47: { title: 'further inter-rivet references (fixity 4, 2.37; plate form)', how: 'restated' },
  S48: { title: 'further inter-rivet references (fixity 4, 2.37; plate form)', how: 'restated' },
  S49: { title: 'further inter-rivet references (fixity 4, 2.37; plate form)', how: 'restated' },
  S51: { title: 'TB 740-97-4 para 11, safety', how: 'part' },
  S52: {
    title:
      '29 CFR 1910.1026, chromium (VI): permissible exposure 5 micrograms per cubic metre over 8 hours, action level 2.5',
    how: 'read',
  },
  S53: {
    title:
      'AC 43.13-1B 4-57c: edge 2 D in a single row, spacing 3 D single row, 4 D in two rows (figure 4-5)',
    how: 'part',
  },
} as const satisfies Record<string, PublishedSource>;
export type SourceId = keyof typeof SOURCES;

/** A table of the trade: its rows and where they stand. */
export interface TradeTable<Row> {
  readonly source: readonly SourceId[];
  readonly how: Reading;
  readonly rows: readonly Row[];
}

/** The source as it is named beside a number: "S7 US Army subcourse AL0992, rivet selection …". */
export function sourceNamed(id: SourceId): string {
  return `${id} ${SOURCES[id].title}`;
}
