import type { SiteSettings } from '../inputs/types.ts';
import { address } from './addresses.ts';
import { currentEdition } from './currentEdition.ts';
import { press } from './press.ts';

/** What stands around every page. */
export interface Frame {
  readonly site: SiteSettings;
  readonly home: string;
  readonly links: readonly { readonly text: string; readonly address: string; readonly here: boolean }[];
  /** Published values beside ours. */
  readonly checked: string;
  /** How to interpolate in the tables. */
  readonly between: string;
  readonly current: { readonly number: string; readonly address: string };
}

const LINKS = ['editions', 'quantities', 'methods'] as const;

/** `place` is the part of the site a page belongs to. */
export async function frame(place?: string): Promise<Frame> {
  const pressed = await press();
  const { number } = currentEdition(pressed).edition;
  return {
    site: pressed.content.site,
    home: address.home(),
    links: LINKS.map((link) => ({
      text: link.charAt(0).toUpperCase() + link.slice(1),
      address: address[link](),
      here: link === place,
    })),
    checked: address.checkedAgainst(),
    between: address.interpolation(),
    current: { number, address: address.edition(number) },
  };
}
