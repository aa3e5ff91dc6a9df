/**
 * Pages, list, rules, manifest and code are one: every code has a page whose example makes the finding and whose cure
 * takes it away, and somebody who gives it.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it, test } from 'vitest';
import { checks } from '../../core/checks';
import { type FindingCode, findingCodes } from '../../core/checks/finding';
import { findingTitles } from '../../core/checks/titles';
import { analyse } from '../../core/index';
import { projectRoot, readProjectFile } from '../support/project-files';
import { rail } from '../support/terminal';

const folder = join(projectRoot, 'media', 'findings');
const pageOf = (code: string) => readFileSync(join(folder, `${code}.md`), 'utf8');
const headings = ['## Cause', '## Figures', '## Cure', '## Example'];
const today = '2027-01-01';

test('every code has one page, and every page a code', () => {
  expect(readdirSync(folder).sort()).toEqual(findingCodes.map((code) => `${code}.md`).sort());
});

test('pages are packed with the extension', () => {
  expect(JSON.parse(readProjectFile('package.json')).files).toContain('media/findings');
});

test('every code is given by some file of the core', () => {
  const sources = readdirSync(join(projectRoot, 'core'), { recursive: true, encoding: 'utf8' })
    .filter((path) => path.endsWith('.ts') && !/checks[/\\](finding|titles)\.ts$/.test(path))
    .map((path) => readFileSync(join(projectRoot, 'core', path), 'utf8'))
    .join('\n');
  expect(findingCodes.filter((code) => !sources.includes(`'${code}'`))).toEqual([]);
});

test('every rule gives a code of the list, and every code has a title of its own', () => {
  expect(checks.map(({ code }) => code).filter((code) => !findingCodes.includes(code))).toEqual([]);
  expect(findingTitles.filter(({ code, title }) => title === code)).toEqual([]);
});

describe.each(findingCodes)('the page of %s', (code: FindingCode) => {
  const page = pageOf(code);
  const [fires, cured] = [...page.matchAll(/```yaml\n([\s\S]*?)```/g)].map(([, text]) => text!);

  it('has its code as a title, and all parts', () => {
    expect(page.startsWith(`# ${code}\n`)).toBe(true);
    for (const heading of headings) {
      const at = page.indexOf(`\n${heading}\n`);
      expect(at, heading).toBeGreaterThan(0);
      expect(page.slice(at + heading.length + 2).trimStart().length).toBeGreaterThan(40);
    }
  });

  it('shows a board with the finding, and one without it and without errors', () => {
    const codes = (text: string) => analyse(text, { file: 'rails.yaml', today }).findings;
    expect(codes(fires!).map((finding) => finding.code)).toContain(code);
    const left = codes(cured!).filter((finding) => finding.code === code || finding.severity === 'error');
    expect(left.map((finding) => `${finding.code}: ${finding.message}`)).toEqual([]);
  });
});

describe('rail-ledger explain', () => {
  it('prints a page, or the list of all', async () => {
    const files = { '/package/media/findings/rail-low.md': pageOf('rail-low') };
    expect(await rail('explain rail-low', { files })).toMatchObject({ code: 0, out: pageOf('rail-low') });
    const { out } = await rail('explain');
    expect(out.trim().split('\n')).toHaveLength(findingCodes.length);
    expect(out).toMatch(/^rail-low +Rail below what it needs$/m);
  });
  it('knows no other codes, and says when a page is missing', async () => {
    expect(await rail('explain rail-lowish')).toMatchObject({ code: 2 });
    const missing = await rail('explain rail-low');
    expect(missing.code).toBe(2);
    expect(missing.err).toContain('there is no such file');
  });
});
