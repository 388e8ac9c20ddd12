export { isVisitorPage }

const shelves = ['/chapters', '/guides', '/glossary', '/calculators', '/lap', '/about']

/** Pages that are the same for every visitor, and so may be kept in memory and by caches on the way. */
function isVisitorPage(path: string): boolean {
  return path === '/' || shelves.some((shelf) => path === shelf || path.startsWith(`${shelf}/`))
}
