const entriesOf = (folder: FileSystemDirectoryEntry): Promise<readonly FileSystemEntry[]> => {
  const reader = folder.createReader()
  // A reader gives a hundred at a time until it gives none.
  const more = (): Promise<readonly FileSystemEntry[]> =>
    new Promise<FileSystemEntry[]>((fulfil, reject) => reader.readEntries(fulfil, reject)).then(async (some) =>
      some.length === 0 ? [] : [...some, ...(await more())],
    )
  return more()
}

/** A file that says where below the dropped folder it lay. */
function placed(file: File, path: string): File {
  Object.defineProperty(file, 'webkitRelativePath', { value: path })
  return file
}

async function filesBelow(entry: FileSystemEntry): Promise<readonly File[]> {
  if (entry.isFile) {
    const file = await new Promise<File>((fulfil, reject) => (entry as FileSystemFileEntry).file(fulfil, reject))
    const path = entry.fullPath.replace(/^\//, '')
    return [path.includes('/') ? placed(file, path) : file]
  }
  if (/^(node_modules|\.git)$/.test(entry.name)) return []
  const entries = await entriesOf(entry as FileSystemDirectoryEntry)
  return (await Promise.all(entries.map(filesBelow))).flat()
}

/** Every file that was dropped, those in folders too. */
export async function droppedFiles(items: DataTransferItemList): Promise<readonly File[]> {
  // Entries must be asked for before the first wait: the list is emptied when the event is over.
  const entries = [...items].map((item) => item.webkitGetAsEntry()).filter((entry) => entry !== null)
  return (await Promise.all(entries.map(filesBelow))).flat()
}
