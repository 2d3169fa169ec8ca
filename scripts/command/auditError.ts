/** Cells of the tables that the audit does not bear out. */
export class AuditError extends Error {
  override name = 'AuditError';
}
