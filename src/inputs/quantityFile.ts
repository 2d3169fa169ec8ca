import { frontMatter } from './frontMatter.ts';
import { quantityPage } from './quantityPage.ts';
import { readText } from './readText.ts';
import type { Checked, QuantityPage } from './types.ts';
import { readYaml } from './yamlFile.ts';

/** Reads the bytes of a quantity page: text, front matter, its keys, and the body. */
export function quantityFile(
  id: string,
  file: string,
  bytes: Uint8Array | null,
  columnIds: readonly string[] | undefined,
): Checked<QuantityPage> {
  const text = readText(file, bytes ?? new Uint8Array());
  const parts = text.value === null ? null : frontMatter(file, text.value);
  const yaml = parts?.value ? readYaml(file, parts.value.yaml) : null;
  const page = parts?.value && yaml?.value ? quantityPage(id, yaml.value, parts.value.body, columnIds) : null;
  const steps = [text, parts, yaml, page].filter((step) => step !== null);
  return { value: page?.value ?? null, problems: steps.flatMap((step) => step.problems) };
}
