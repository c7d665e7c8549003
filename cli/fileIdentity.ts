/** What tells whether two names mean the same file. */
export interface FileIdentity {
  /** As the user wrote it. */
  readonly name: string;
  /** Absolute, links resolved. */
  readonly path: string;
  /** Device and inode; absent where the file does not exist yet. */
  readonly inode?: string | undefined;
}

/** Whether two names mean the same file, by a link or another spelling too. */
export function isSameFile(a: FileIdentity, b: FileIdentity): boolean {
  return a.path === b.path || (a.inode !== undefined && a.inode === b.inode);
}
