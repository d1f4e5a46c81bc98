import type { QuestionRow } from '@rivetside/shared';

/** A question about a hole of the stabiliser that waits for its first fix, unless the test says otherwise. */
export function makeQuestionRow(facts: Partial<QuestionRow> = {}): QuestionRow {
  return {
    id: '0190a0b0-0000-7000-8000-00000000a014',
    number: 'STB-Q-014',
    title: 'Hole 7 in the doubler will not line up with the spar',
    state: 'open',
    mishap: 'misalignedHole',
    discipline: 'sheetMetal',
    audience: 'chapter',
    headline: { text: 'next size, pitch 3.9 D', verdict: 'marginal' },
    waits: { for: 'firstFix', since: '2025-05-10T19:52:00.000Z' },
    kitId: '0190a0b0-0000-7000-8000-00000000f002',
    section: {
      id: '0190a0b0-0000-7000-8000-000000005001',
      code: 'STB',
      name: 'Stabiliser',
      critical: false,
      regions: ['L-stab', 'R-stab'],
    },
    partNumber: 'STB/dr-03',
    holeLineCode: 'HL-STB-3',
    serial: 141,
    chapterId: '0190a0b0-0000-7000-8000-0000000000c1',
    chapterName: 'Fenmoor',
    askedBy: { id: '0190a0b0-0000-7000-8000-000000000001', name: 'Ottoline Brackwater' },
    askedAt: '2025-05-10T19:52:00.000Z',
    lastActivityAt: '2025-05-10T19:52:00.000Z',
    unread: false,
    ...facts,
  };
}
