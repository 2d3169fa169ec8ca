import type { Certificate, CertificateEntry } from '../inputs/certificate.ts';

/** The entry that speaks of exactly these bytes; undefined when the table was not audited, or has changed since. */
export function certificateEntry(
  certificate: Certificate | undefined,
  table: string,
  checksum: string,
): CertificateEntry | undefined {
  return certificate?.tables.find((one) => one.table === table && one.sha256 === checksum);
}
