import type { SheetFile } from './model/memorySource.ts';

/** Most files that are read of a folder; a house has a dozen. */
const MOST_FILES = 500;

/** Files that were chosen, by their paths in an opened folder where there is one. */
export function chosenFiles(list: FileList | null): Promise<SheetFile[]> {
  const files = [...(list ?? [])].slice(0, MOST_FILES);
  return Promise.all(files.map((file) => sheetFile(file, file.webkitRelativePath || file.name)));
}

/** Files that were dropped, folders with all that lies in them. */
export async function droppedFiles(transfer: DataTransfer): Promise<SheetFile[]> {
  const entries = [...transfer.items].map((item) => item.webkitGetAsEntry()).filter((entry) => entry !== null);
  if (entries.length === 0) return chosenFiles(transfer.files);
  const found = await Promise.all(entries.map((entry) => filesBelow(entry)));
  return Promise.all(
    found
      .flat()
      .slice(0, MOST_FILES)
      .map(({ file, path }) => sheetFile(file, path)),
  );
}

interface Found {
  readonly file: File;
  readonly path: string;
}

async function filesBelow(entry: FileSystemEntry): Promise<Found[]> {
  const path = entry.fullPath.replace(/^\//, '');
  if (isFile(entry)) return [{ file: await new Promise<File>((resolve, reject) => entry.file(resolve, reject)), path }];
  if (!isFolder(entry) || entry.name.startsWith('.') || entry.name === 'node_modules') return [];
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

async function sheetFile(file: File, name: string): Promise<SheetFile> {
  return { name, bytes: new Uint8Array(await file.arrayBuffer()) };
}
