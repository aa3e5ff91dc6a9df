/**
 * Says once which figures of the report this version leaves empty, so that nobody waits for them or takes their
 * absence for a zero. Keys of the file without effect are reported where they are read.
 */
import { whyEndless } from '../analysis/battery-store';
import { isGap } from '../analysis/gap';
import type { BoardAnalysis } from '../analysis/types';
import type { Span } from '../text/span';
import type { Check } from './check';
import type { Finding } from './finding';

/** Fields of the report, with the words for them. */
const emptyFields: readonly string[] = [
  'ripple, load line and drops of rails that neither a pump nor a filter makes',
];

export const notComputed: Check = {
  code: 'not-computed',
  title: 'Figures that are not computed yet',
  severity: 'information',
  why: 'An empty figure must not be mistaken for a harmless one.',
  run: (analysis) => {
    const place = firstPump(analysis);
    const others = [...unknownLives(analysis), ...uncomparedBench(analysis), ...unjudged(analysis)];
    if (place === undefined) return others;
    return [
      ...others,
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

/** Needs of rails whose ripple or way up and down the file says nothing about. */
function unjudged(analysis: BoardAnalysis): readonly Finding[] {
  return [...analysis.rails.values()].flatMap(({ rail, ripple }) =>
    (['ripple', 'start', 'discharge'] as const).flatMap((key): Finding[] => {
      const need = rail.needs?.[key];
      if (!need || !rail.origin || rail.origin.kind === 'pump' || (key === 'ripple' && ripple)) return [];
      return [
        {
          code: 'not-computed',
          severity: 'information',
          at: `${rail.path}.needs.${key}`,
          span: need.span ?? rail.nameSpan,
          message: `${rail.name}: this need is not judged, since nothing in the file tells the ${key === 'ripple' ? 'ripple' : 'switching'} of a rail that no pump makes.`,
        },
      ];
    }),
  );
}

/** Batteries whose life nobody can tell, and capacities of what does not run down; a life that is needed is judged elsewhere. */
function unknownLives(analysis: BoardAnalysis): readonly Finding[] {
  return [...analysis.supplies.values()].flatMap(({ supply, life }): readonly Finding[] => {
    const finding = (key: string, span: Span | undefined, message: string): Finding => ({
      code: 'not-computed',
      severity: 'information',
      at: `${supply.path}${key}`,
      span: span ?? supply.nameSpan,
      message,
    });
    if (!life) {
      if (!supply.capacity) return [];
      const why = `This capacity has no effect: ${whyEndless(supply)}.`;
      return [finding('.capacity', supply.capacity.span, why)];
    }
    const found = supply.life ? undefined : life();
    if (!found || !isGap(found)) return [];
    return [finding('', undefined, `The life of ${supply.name} is not computed: ${found.because}.`)];
  });
}

/** Bench entries that are whole, but of a rail without a figure to set against them. */
function uncomparedBench(analysis: BoardAnalysis): readonly Finding[] {
  return analysis.bench().flatMap(({ point, rail, predicted, because }): readonly Finding[] => {
    if (!rail || !point.load) return [];
    const finding = (key: string, span: Span, message: string): Finding => ({
      code: 'not-computed',
      severity: 'information',
      at: `${point.path}${key}`,
      span,
      message,
    });
    if (!predicted) {
      const why = `This measurement of ${rail.name} is not compared: ${because ?? 'no voltage is predicted'}.`;
      return [finding('', point.rail?.span ?? point.span, why)];
    }
    if (!point.ripple || predicted.ripple) return [];
    const why = `This ripple is not compared: no pump makes ${rail.name}, and bench entries are set against the ripple of pumps only.`;
    return [finding('.ripple', point.ripple.span ?? point.span, why)];
  });
}

function firstPump(analysis: BoardAnalysis) {
  for (const { rail } of analysis.rails.values())
    if (rail.origin?.kind === 'pump') return rail.keys.get('pump') ?? rail.nameSpan;
  return undefined;
}
