import { readText } from './readText.ts';
import type { Checked } from './types.ts';
import { readYaml, type YamlFile } from './yamlFile.ts';

/** Reads the bytes of a YAML file; null stands for a file that is not there. */
export function openYaml(file: string, bytes: Uint8Array | null): Checked<YamlFile> {
  if (bytes === null) {
    return {
      value: null,
      problems: [{ file, line: 1, column: 1, wrong: 'the file is missing', expected: 'this file' }],
    };
  }
  const text = readText(file, bytes);
  if (text.value === null) return { value: null, problems: text.problems };
  const yaml = readYaml(file, text.value);
  return { value: yaml.value, problems: [...text.problems, ...yaml.problems] };
}
