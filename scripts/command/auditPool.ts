import { once } from 'node:events';
import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import type { AuditedPart, AuditPart } from '../../src/tables/auditPart.ts';

/**
 * Audits parts in as many threads as there are cores. `found` is told of each part as it is done; parts that cost the
 * most should come first.
 */
export async function auditPool(
  parts: readonly AuditPart[],
  found: (part: AuditPart, audited: AuditedPart) => void,
): Promise<void> {
  const waiting = [...parts];
  const threads = Math.min(availableParallelism(), parts.length);
  await Promise.all(Array.from({ length: threads }, () => work(waiting, found)));
}

async function work(waiting: AuditPart[], found: (part: AuditPart, audited: AuditedPart) => void): Promise<void> {
  const worker = new Worker(new URL('./auditWorker.ts', import.meta.url));
  try {
    for (let part = waiting.shift(); part !== undefined; part = waiting.shift()) {
      worker.postMessage(part);
      // `once` rejects when the thread ends with an error.
      const [audited] = (await once(worker, 'message')) as [AuditedPart];
      found(part, audited);
    }
  } finally {
    await worker.terminate();
  }
}
