/**
 * Says once which figures of the report this version leaves empty, so that nobody waits for them or takes their
 * absence for a zero. Keys of the file without effect are reported where they are read.
 */
import type { BoardAnalysis } from '../analysis/types';
import type { Check } from './check';

/** Fields of the report, with the words for them. */
const emptyFields: readonly string[] = [
  'life of batteries',
  'ripple, load line and drops of rails that neither a pump nor a filter makes',
];

export const notComputed: Check = {
  code: 'not-computed',
  title: 'Figures that are not computed yet',
  severity: 'information',
  why: 'An empty figure must not be mistaken for a harmless one.',
  run: (analysis) => {
    const place = firstPump(analysis);
    if (place === undefined) return [];
    return [
      {
        code: 'not-computed',
        severity: 'information',
        at: 'rails',
        span: place,
        message: `This version does not compute ${emptyFields.join(', ')}: they are null in the report.`,
      },
    ];
  },
};

function firstPump(analysis: BoardAnalysis) {
  for (const { rail } of analysis.rails.values())
    if (rail.origin?.kind === 'pump') return rail.keys.get('pump') ?? rail.nameSpan;
  return undefined;
}
