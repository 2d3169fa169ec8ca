import { PRESS_KEY, type Press } from './press.ts';

/** Leaves what was pressed for the pages of the same process; `press()` finds it. */
export function leavePress(press: Press): void {
  Object.assign(globalThis, { [PRESS_KEY]: press });
}
