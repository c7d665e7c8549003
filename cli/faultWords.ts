/** What the operating system's codes mean, for a person. */
const faultWords: Readonly<Record<string, string>> = {
  EACCES: 'permission denied',
  EPERM: 'permission denied',
  EROFS: 'the disk is read-only',
  ENOSPC: 'the disk is full',
  EDQUOT: 'the disk quota is used up',
  EFBIG: 'the file would be too large for this disk',
  ENOENT: 'its folder does not exist',
  ENOTDIR: 'a part of its path is a file, not a folder',
  EISDIR: 'this is a folder',
  ELOOP: 'links lead in a circle',
  ENAMETOOLONG: 'its name is too long',
  EMFILE: 'too many files are open',
  ENFILE: 'too many files are open',
  EBUSY: 'another program is using it',
  EIO: 'the disk reports an error',
  ENXIO: 'no such device',
  EINVAL: 'the name cannot be used',
  ERR_INVALID_ARG_VALUE: 'the name cannot be used',
};

/** Code of a system fault (`ENOENT`); empty for anything else. */
export function faultCode(fault: unknown): string {
  return fault instanceof Error && 'code' in fault ? String(fault.code) : '';
}

/** A system fault in words, its code alone where there are none. */
export function faultText(fault: unknown): string {
  const code = faultCode(fault);
  return faultWords[code] ?? (code === '' ? 'for an unknown reason' : code);
}
