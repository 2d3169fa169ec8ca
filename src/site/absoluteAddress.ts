import type { SiteSettings } from '../inputs/types.ts';

/** An address with the origin of the site before it, as a citation needs it. */
export function absoluteAddress({ site }: SiteSettings, path: string): string {
  return new URL(path, site).href;
}
