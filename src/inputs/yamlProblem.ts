import type { YAMLError } from 'yaml';

interface Words {
  readonly wrong: string;
  readonly expected: string;
}

/** Messages of the YAML parser that keepers will meet, in words for somebody who has never read its grammar. */
const KNOWN: readonly { readonly pattern: RegExp; readonly words: (match: RegExpExecArray, found: string) => Words }[] =
  [
    {
      pattern: /^Tabs are not allowed/,
      words: () => ({ wrong: 'a tab indents this line', expected: 'spaces' }),
    },
    {
      pattern: /^Map keys must be unique/,
      words: (_, found) => ({ wrong: `key ${found} is given twice`, expected: 'each key once' }),
    },
    {
      pattern: /multiple documents/,
      words: () => ({ wrong: 'a second document starts here', expected: 'no line "---" inside the file' }),
    },
    {
      pattern: /^Unresolved tag/,
      words: (_, found) => ({ wrong: `tag ${found} is not used here`, expected: 'the value without a tag' }),
    },
    {
      pattern: /^Nested mappings are not allowed/,
      words: () => ({
        wrong: 'a key inside the value of another key',
        expected: 'each key on a line of its own, or quotes around text that has ": " in it',
      }),
    },
    {
      pattern: /end with a ([\]}])|expected flow (?:map|sequence) to end/,
      words: ([, bracket = ']']) => ({
        wrong: 'a bracket is still open',
        expected: `a "${bracket}" before this place`,
      }),
    },
    {
      pattern: /^Missing closing (.)quote/,
      words: ([, quote = '"']) => ({
        wrong: 'a quote is still open',
        expected: `a closing ${quote} before this place`,
      }),
    },
    {
      pattern: /^Implicit (?:map )?keys need to be/,
      words: () => ({ wrong: 'a line without "key: value"', expected: 'a colon and a blank after each key' }),
    },
    {
      pattern: /^Invalid escape sequence (.+)/,
      words: ([, sequence = '']) => ({
        wrong: `"${sequence}" means nothing in double quotes`,
        expected: 'single quotes, which keep a backslash',
      }),
    },
    {
      pattern: /^Plain value cannot start with/,
      words: (_, found) => ({ wrong: `a value starts with ${found.charAt(0)}`, expected: 'quotes around it' }),
    },
  ];

/** What is wrong and what was expected, for one error or warning of the parser. */
export function yamlProblem(error: YAMLError, text: string): Words {
  const found = /^[^\s:,[\]{}]+/.exec(text.slice(error.pos[0]))?.[0] ?? '';
  for (const { pattern, words } of KNOWN) {
    const match = pattern.exec(error.message);
    if (match !== null) return words(match, found);
  }
  const line = error.message.split('\n', 1)[0] ?? '';
  return {
    wrong: `broken YAML: ${line.charAt(0).toLowerCase()}${line.slice(1)}`,
    expected: 'valid YAML, with quotes around text that has special characters',
  };
}
