/** Whether the record could not be written because its disk is full, failing or read-only: reading still works. */
export function isNotSaving(error: unknown): boolean {
  if (typeof error !== 'object' || error === null || !('code' in error)) return false;
  const code = String(error.code);
  return code === 'SQLITE_FULL' || code.startsWith('SQLITE_IOERR') || code.startsWith('SQLITE_READONLY');
}
