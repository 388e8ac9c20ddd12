export { databaseEnvironment }

import process from 'node:process'

/**
 * The environment without anything that would lead PostgreSQL's programs or its client library to another
 * server (PGHOST, PGSERVICE ...), in a locale that every Debian has.
 */
function databaseEnvironment(extra = {}) {
  const kept = Object.entries(process.env).filter(
    ([name]) => !name.startsWith('PG') && !/^(LC_|LANG)/.test(name),
  )
  return { ...Object.fromEntries(kept), LC_ALL: 'C.UTF-8', ...extra }
}
