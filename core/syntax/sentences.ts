/**
 * What a YAML error means for somebody who writes a board file, by the parser's error code.
 */

const sentences: Readonly<Record<string, string>> = {
  ALIAS_PROPS: 'An alias (`*name`) cannot have an anchor or a tag of its own.',
  BAD_ALIAS: 'An alias needs a name: `*name`.',
  BAD_COLLECTION_TYPE: 'The tag does not fit what stands behind it.',
  BAD_DIRECTIVE: 'This directive line is not understood; a board file needs none.',
  BAD_DQ_ESCAPE: 'No such escape in double quotes: write `\\\\` for a backslash, or use single quotes.',
  BAD_INDENT: 'The indentation fits no entry above: keys of one map stand in one column.',
  BAD_PROP_ORDER: 'An anchor or tag stands before the value on the same line.',
  BAD_SCALAR_START: 'A value cannot begin with this character: put it in quotes.',
  BLOCK_AS_IMPLICIT_KEY:
    'Two `key: value` pairs cannot stand on one line: put the second on its own line, or write `{ key: value }`.',
  BLOCK_IN_FLOW: 'Inside `{ }` or `[ ]` entries are separated by commas, not by lines.',
  IMPOSSIBLE: 'This line cannot be read.',
  KEY_OVER_1024_CHARS: 'A key is at most 1024 characters long.',
  MULTILINE_IMPLICIT_KEY: 'A key stands on one line: is a colon missing behind it?',
  MULTIPLE_ANCHORS: 'A value has at most one anchor.',
  MULTIPLE_DOCS: 'A board file is one document: nothing behind a `---` or `...` line is read.',
  MULTIPLE_TAGS: 'A value has at most one tag.',
  NON_STRING_KEY: 'A key is a plain word here.',
  RESOURCE_EXHAUSTION: 'The file is nested too deeply to be read.',
  TAB_AS_INDENT: 'Indent with blanks: YAML does not allow tabs here.',
  TAG_RESOLVE_FAILED: 'Tags (`!name`) have no meaning in a board file: this one is ignored.',
};

/** `raw` is the parser's own message, for the codes that cover several mistakes. */
export function syntaxSentence(code: string, raw: string, excerpt: string): string {
  if (code === 'MISSING_CHAR' || raw.includes('end with a')) return missing(raw, excerpt);
  if (code === 'UNEXPECTED_TOKEN') return `\`${excerpt}\` cannot stand here.`;
  return sentences[code] ?? 'This cannot be read as YAML.';
}

function missing(raw: string, excerpt: string): string {
  const known = missingThings.find(([pattern]) => pattern.test(raw));
  return known ? known[1](excerpt) : 'A character is missing here.';
}

const missingThings: readonly (readonly [RegExp, (excerpt: string) => string])[] = [
  [/closing .quote/, () => 'The closing quote is missing.'],
  [/end with a \}/, () => 'The closing `}` is missing.'],
  [/end with a \]/, () => 'The closing `]` is missing.'],
  [/Implicit map keys/, (excerpt) => `A colon and a value are missing behind \`${excerpt}\`.`],
  [/Missing ,/, () => 'A comma is missing between two entries.'],
  [/space after :/, () => 'A blank is missing behind the colon.'],
  [/Sequence item/, () => 'An entry of a list begins with `- `.'],
  [/Comments must/, () => 'A comment needs a blank before its `#`.'],
  [/Tags and anchors/, () => 'An anchor or tag needs a blank behind it.'],
  [/new ?line|same line/i, () => 'This begins on a line of its own.'],
];
