import { startExtended } from '../../numerics/extended/library.ts';

/** Loads what the audit computes with. Everything else in this folder is synchronous, once this has resolved. */
export async function startAudit(): Promise<void> {
  await startExtended();
}
