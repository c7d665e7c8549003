import type { SheetFile } from './model/memorySource.ts';

/** Most files that are read of a folder; a house has a dozen. */
const MOST_FILES = 500;
/** Folders that hold no house. */
const PASSED_OVER = /^(?:\..*|node_modules)$/;

/** Files that were chosen, by their paths in an opened folder where there is one. */
export function chosenFiles(list: FileList | null): Promise<SheetFile[]> {
  const files = [...(list ?? [])].slice(0, MOST_FILES);
  return Promise.all(files.map((file) => sheetFile({ file, path: file.webkitRelativePath || file.name })));
}

/**
 * Files that were dropped, folders with all that lies in them.
 *
 * @returns rejected where a browser does not hand over what lies in a folder
 */
export async function droppedFiles(transfer: DataTransfer): Promise<SheetFile[]> {
  // what was dropped is gone once this function has returned, so all of it is asked for at once
  const found = await Promise.all([...transfer.items].filter(({ kind }) => kind === 'file').map(filesOfItem));
  return Promise.all(found.flat().slice(0, MOST_FILES).map(sheetFile));
}

interface Found {
  readonly file: File;
  readonly path: string;
}

/** A handle of a folder, which not every browser has. */
interface FolderHandle {
  readonly kind: 'directory';
  readonly name: string;
  values(): AsyncIterable<FolderHandle | FileHandle>;
}

interface FileHandle {
  readonly kind: 'file';
  readonly name: string;
  getFile(): Promise<File>;
}

interface ItemWithHandle extends DataTransferItem {
  getAsFileSystemHandle(): Promise<FolderHandle | FileHandle | null>;
}

function filesOfItem(item: DataTransferItem): Promise<Found[]> {
  const entry = item.webkitGetAsEntry();
  if (entry === null || !isFolder(entry)) {
    const file = item.getAsFile();
    return Promise.resolve(file === null ? [] : [{ file, path: file.name }]);
  }
  // a page that was opened from a file may read folders by handles only
  return hasHandle(item)
    ? item.getAsFileSystemHandle().then((handle) => (handle === null ? [] : filesInHandle(handle, handle.name)))
    : filesBelow(entry);
}

function hasHandle(item: DataTransferItem): item is ItemWithHandle {
  return 'getAsFileSystemHandle' in item;
}

async function filesInHandle(handle: FolderHandle | FileHandle, path: string): Promise<Found[]> {
  if (handle.kind === 'file') return [{ file: await handle.getFile(), path }];
  const found: Found[] = [];
  for await (const inner of handle.values()) {
    if (found.length > MOST_FILES) break;
    if (!PASSED_OVER.test(inner.name)) found.push(...(await filesInHandle(inner, `${path}/${inner.name}`)));
  }
  return found;
}

async function filesBelow(entry: FileSystemEntry): Promise<Found[]> {
  const path = entry.fullPath.replace(/^\//, '');
  if (isFile(entry)) return [{ file: await new Promise<File>((resolve, reject) => entry.file(resolve, reject)), path }];
  if (!isFolder(entry) || PASSED_OVER.test(entry.name)) return [];
  const reader = entry.createReader();
  const inside: FileSystemEntry[] = [];
  // a browser hands the entries of a folder over in portions, an empty one last
  for (;;) {
    const some = await new Promise<FileSystemEntry[]>((resolve, reject) => reader.readEntries(resolve, reject));
    if (some.length === 0 || inside.length > MOST_FILES) break;
    inside.push(...some);
  }
  return (await Promise.all(inside.map((each) => filesBelow(each)))).flat();
}

function isFile(entry: FileSystemEntry): entry is FileSystemFileEntry {
  return entry.isFile;
}

function isFolder(entry: FileSystemEntry): entry is FileSystemDirectoryEntry {
  return entry.isDirectory;
}

async function sheetFile({ file, path }: Found): Promise<SheetFile> {
  return { name: path, bytes: new Uint8Array(await file.arrayBuffer()) };
}
