import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { checks } from '../../../core/checks';
import { findingCodes } from '../../../core/checks/finding';

const rules = fileURLToPath(new URL('../../../core/checks/', import.meta.url));
const tests = fileURLToPath(new URL('.', import.meta.url));

describe('list of rules', () => {
  it('is sorted by code, without doubles', () => {
    const codes = checks.map(({ code }) => code);
    expect(codes).toEqual([...new Set(codes)].sort());
  });

  it('holds every file that defines a rule', () => {
    const defining = readdirSync(rules).filter((file) =>
      /: Check = \{/.test(readFileSync(rules + file, 'utf8')),
    );
    expect(defining.map((file) => file.replace('.ts', ''))).toEqual(checks.map(({ code }) => code));
  });

  it('gives every rule a test of the same name, a known code, a title and a reason', () => {
    for (const { code, title, why } of checks) {
      expect(existsSync(`${tests}${code}.test.ts`), code).toBe(true);
      expect(findingCodes).toContain(code);
      expect(title).toMatch(/^[A-Z].{5,}[^.]$/);
      expect(why).toMatch(/^[A-Z].{20,}\.$/);
    }
  });
});
