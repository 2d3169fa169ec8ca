import { unitHtml } from '../../site/unitText.ts';
import { writtenNumber } from '../../site/writtenNumber.ts';
import type { Value } from './hit.ts';

const NUMBER = /^[-+]?\d+(?:\.\d+)?(?:[eE][-+]?\d+)?$/;

/** Writes a value as the pages print one: the same digits as the file, with real signs, powers of ten and units. */
export function showValue(place: Element, { written, u, unit }: Value): void {
  place.replaceChildren();
  append(place, written);
  if (u !== undefined) {
    place.append(' ± ');
    append(place, u);
  }
  if (unit !== '') place.insertAdjacentHTML('beforeend', ` ${unitHtml(unit)}`);
}

/** A number as HTML of our own making; anything else, such as words out of a file, strictly as text. */
function append(place: Element, written: string): void {
  if (NUMBER.test(written)) place.insertAdjacentHTML('beforeend', writtenNumber(written));
  else place.append(written);
}
