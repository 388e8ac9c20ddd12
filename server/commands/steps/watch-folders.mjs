export { watchFolders }

import fs from 'node:fs'
import path from 'node:path'

/**
 * Tells when a file below these folders changes. Every folder is watched by itself and not its files, so that
 * editors which save by replacing a file are noticed too, as are new files and folders.
 * @param {string[]} folders absolute paths
 * @param {(file: string) => void} onChange absolute path of the file
 * @returns {() => void} stops watching
 */
function watchFolders(folders, onChange) {
  const watchers = new Map()

  function watch(folder) {
    if (watchers.has(folder)) return
    const watcher = fs.watch(folder, (event, name) => {
      const file = path.join(folder, name ?? '')
      if (isFolder(file)) watchAll(file)
      else onChange(file)
    })
    // A folder that is removed ends its watcher with an error on some systems.
    watcher.on('error', () => unwatch(folder))
    watchers.set(folder, watcher)
  }

  function unwatch(folder) {
    watchers.get(folder)?.close()
    watchers.delete(folder)
  }

  function watchAll(folder) {
    watch(folder)
    for (const entry of fs.readdirSync(folder, { withFileTypes: true })) {
      if (entry.isDirectory()) watchAll(path.join(folder, entry.name))
    }
  }

  for (const folder of folders) watchAll(folder)
  return () => {
    for (const folder of [...watchers.keys()]) unwatch(folder)
  }
}

function isFolder(file) {
  return fs.statSync(file, { throwIfNoEntry: false })?.isDirectory() ?? false
}
