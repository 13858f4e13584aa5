/** A file of a drop with its path inside the dropped folder. */
export interface DroppedFile {
  path: string;
  file: File;
}

/** Every file of a drop, folders opened all the way down. Entries must be taken before the first await. */
export async function droppedFiles(data: DataTransfer): Promise<DroppedFile[]> {
  const entries = [...data.items].flatMap((item) => item.webkitGetAsEntry() ?? []);
  const found: DroppedFile[] = [];
  for (const entry of entries) await collect(entry, found);
  return found;
}

async function collect(entry: FileSystemEntry, found: DroppedFile[]): Promise<void> {
  if (entry.isFile) {
    const file = await new Promise<File>((resolve, reject) =>
      (entry as FileSystemFileEntry).file(resolve, reject),
    );
    found.push({ path: entry.fullPath.replace(/^\//, ''), file });
    return;
  }
  const reader = (entry as FileSystemDirectoryEntry).createReader();
  for (;;) {
    // A folder is handed out in pieces of at most 100 entries; an empty piece is its end.
    const piece = await new Promise<FileSystemEntry[]>((resolve, reject) =>
      reader.readEntries(resolve, reject),
    );
    if (piece.length === 0) return;
    for (const child of piece) await collect(child, found);
  }
}
