import { checkYaml } from './checkYaml.ts';
import { mapping, text } from './fields.ts';
import type { Checked, SiteSettings } from './types.ts';
import type { YamlFile } from './yamlFile.ts';

const ORIGIN = 'the address of the server without a path: https://tables.lanternfell.example';
const BASE = 'the path below it with a slash at both ends: / or /tables/';

const schema = mapping({
  title: text('the name of the collection'),
  group: text('the group that publishes it'),
  site: text(ORIGIN).refine(isOrigin, { error: ORIGIN }),
  base: text(BASE).regex(/^\/([A-Za-z0-9._~-]+\/)*$/, { error: BASE }),
  licence: mapping({
    name: text('the licence of the tables: CC BY 4.0'),
    url: text('its address').refine(isAddress, { error: 'an address that starts with https:// or http://' }),
  }),
  contact: text('how to reach the keeper').optional(),
});

/** Reads `site.yaml`. */
export function siteSettings(yaml: YamlFile): Checked<SiteSettings> {
  return checkYaml(yaml, schema);
}

function isAddress(address: string): boolean {
  return /^https?:\/\//.test(address) && URL.canParse(address);
}

function isOrigin(address: string): boolean {
  return isAddress(address) && new URL(address).origin === address.replace(/\/$/, '');
}
