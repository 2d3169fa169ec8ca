import { parentPort } from 'node:worker_threads';
import { type AuditPart, auditPart } from '../../src/tables/auditPart.ts';

/** Audits the parts it is sent, one after the other, and sends back what it found. */
parentPort?.on('message', async (part: AuditPart) => {
  parentPort?.postMessage(await auditPart(part));
});
