import type { Problem } from './types.ts';

/** One line for each problem, `file:line:column  what is wrong  what was expected`, and a last line that counts them. */
export function formatProblems(problems: readonly Problem[]): string {
  const lines = problems.map(
    ({ file, line, column, wrong, expected }) =>
      `${file}:${line}:${column}  ${wrong}  ${expected.startsWith('did you mean') ? '' : 'expected '}${expected}`,
  );
  const files = new Set(problems.map(({ file }) => file)).size;
  return [...lines, `${counted(problems.length, 'problem')} in ${counted(files, 'file')}`].join('\n');
}

function counted(count: number, what: string): string {
  return `${count} ${what}${count === 1 ? '' : 's'}`;
}
