/**
 * Every finding with a few words: of the rules from the rules themselves, of the text and the computation from here.
 */

import { type FindingCode, findingCodes } from './finding';
import { checks } from './index';

const others: Partial<Record<FindingCode, string>> = {
  syntax: 'Text that cannot be read as meant',
  'unknown-key': 'Key that the language does not have',
  'missing-key': 'Key that an entry needs',
  'unknown-name': 'Name of nothing in the file or the catalogue',
  'duplicate-name': 'Two entries of one name',
  'bad-quantity': 'Figure that cannot be read or makes no sense',
  'wrong-unit': 'Figure in a unit that does not fit',
  'rail-cycle': 'Rails that stand on each other in a circle',
  'include-failed': 'Included file that cannot be used',
  'clock-unreachable': 'Timer registers that make no square wave',
  'waiver-stale': 'Waiver that silences nothing',
  'not-converged': 'Circuit without a steady state',
  assumed: 'Figure that the tool filled in',
};

export const findingTitles: readonly { readonly code: FindingCode; readonly title: string }[] =
  findingCodes.map((code) => ({
    code,
    title: others[code] ?? checks.find((check) => check.code === code)?.title ?? code,
  }));
