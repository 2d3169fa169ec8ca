import type { YAMLError } from 'yaml';

/** A message of the YAML parser in words for somebody who has never read its grammar. */
export function yamlProblem(error: YAMLError, text: string): { wrong: string; expected: string } {
  const word = /^[^\s:,[\]{}]+/.exec(text.slice(error.pos[0]))?.[0] ?? '';
  switch (error.code) {
    case 'TAB_AS_INDENT':
      return { wrong: 'a tab indents this line', expected: 'spaces' };
    case 'DUPLICATE_KEY':
      return { wrong: `key ${word} is given twice`, expected: 'each key once' };
    case 'MULTIPLE_DOCS':
      return { wrong: 'a second document starts here', expected: 'one document, so no line "---" inside the file' };
    case 'TAG_RESOLVE_FAILED':
      return { wrong: `tag ${word} is not used here`, expected: 'the value without a tag' };
    case 'BLOCK_AS_IMPLICIT_KEY':
      return {
        wrong: 'a key inside the value of another key',
        expected: 'one key on each line; text with ": " in quotes',
      };
    case 'MISSING_CHAR':
    case 'MULTILINE_IMPLICIT_KEY':
    case 'BAD_INDENT':
      return {
        wrong: `broken YAML: ${sentence(error.message)}`,
        expected: 'keys as "key: value", each bracket and quote closed',
      };
    default:
      return {
        wrong: `broken YAML: ${sentence(error.message)}`,
        expected: 'valid YAML; text with special characters in quotes',
      };
  }
}

function sentence(message: string): string {
  const line = message.split('\n', 1)[0] ?? '';
  return line.charAt(0).toLowerCase() + line.slice(1);
}
