/** What can be wrong with the storage that a person should be told of. */
export type StorageFault = "storage-full" | "storage-busy";

/**
 * The fault of the storage that an error of the database tells of: no room left on the disk, or
 * another process that holds the file longer than we wait. Undefined for every other error.
 */
export function storageFault(error: unknown): StorageFault | undefined {
  const code = error instanceof Error && "code" in error ? String(error.code) : "";
  if (code === "SQLITE_FULL" || code === "SQLITE_IOERR_SHMSIZE") return "storage-full";
  return code.startsWith("SQLITE_BUSY") ? "storage-busy" : undefined;
}
