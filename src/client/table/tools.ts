import { startGoTo } from './goToTool.ts';
import { partsOf } from './parts.ts';
import { startRuler } from './ruler.ts';
import { startThumbs } from './thumbs.ts';
import { startViewTools } from './viewTools.ts';

/** Brings the tools of a table page to life; until then they are hidden, because without this script they do nothing. */
export function startTableTools(tools: HTMLElement, table: HTMLTableElement): void {
  const parts = partsOf(table);
  tools.hidden = false;
  const view = startViewTools(parts, tools);
  startGoTo(parts, tools, startRuler(parts), view);
  const index = document.querySelector<HTMLElement>('.thumbs');
  if (index) startThumbs(parts, index);
}
