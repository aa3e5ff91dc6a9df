/**
 * `bench`, `waivers` and `include`: the file against the world outside it.
 */
import { findingCodes } from '../../checks/finding';
import { benchShape, waiverShape } from '../../format';
import type { BenchPoint, Include, Waiver } from '../board';
import { listOf } from '../entries';
import { figureOf } from '../figures';
import { present } from '../present';
import { openMap, type Slot } from '../slot';
import { nameOf, refOf, reportUnknownName, textOf } from '../words';

export function benchOf(slot: Slot | undefined): BenchPoint[] {
  return listOf(slot).flatMap((item): BenchPoint[] => {
    const fields = openMap(item, benchShape);
    if (!fields) return [];
    return [
      {
        span: fields.span,
        path: item.path,
        ...present({
          rail: nameOf(fields.at('rail')),
          load: figureOf(fields.at('load')),
          voltage: figureOf(fields.at('voltage')),
          ripple: figureOf(fields.at('ripple')),
          note: textOf(fields.at('note')),
        }),
      },
    ];
  });
}

export function waiversOf(slot: Slot | undefined): Waiver[] {
  return listOf(slot).flatMap((item): Waiver[] => {
    const fields = openMap(item, waiverShape);
    if (!fields) return [];
    const finding = refOf(fields.at('finding'));
    if (finding && !(findingCodes as readonly string[]).includes(finding.name)) {
      reportUnknownName(item.context, `${item.path}.finding`, finding, 'finding', findingCodes);
    }
    return [
      {
        span: fields.span,
        path: item.path,
        ...present({
          finding,
          at: refOf(fields.at('at')),
          because: textOf(fields.at('because')),
          until: textOf(fields.at('until')),
        }),
      },
    ];
  });
}

export function includesOf(slot: Slot | undefined): Include[] {
  return listOf(slot).flatMap((item) => {
    const ref = refOf(item);
    return ref ? [{ ...ref, path: item.path }] : [];
  });
}
