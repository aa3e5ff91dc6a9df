import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { analyse } from '../../core/index';

it('shows a board in the README that is read and meets its needs', () => {
  const readme = readFileSync(new URL('../../README.md', import.meta.url), 'utf8');
  const board = /```yaml\n([\s\S]*?)```/.exec(readme)?.[1];
  expect(board).toBeDefined();
  const { findings, report } = analyse(board!, { file: 'rails.yaml' });
  expect(findings.filter((finding) => finding.severity !== 'information')).toEqual([]);
  expect(report.rails['v8']!.headroom).toBeGreaterThan(0);
});

it('names only scripts that exist', () => {
  const { scripts } = JSON.parse(readFileSync(new URL('../../package.json', import.meta.url), 'utf8'));
  for (const page of ['README.md', 'DEVELOPERS.md']) {
    const text = readFileSync(new URL(`../../${page}`, import.meta.url), 'utf8');
    const named = [...text.matchAll(/npm run ([\w:]+)/g)].map((match) => match[1]!);
    expect(named.length).toBeGreaterThan(0);
    for (const name of named) expect(Object.keys(scripts), page).toContain(name);
  }
});
