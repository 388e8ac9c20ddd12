export { SLUG }

/** What an address of a guide looks like; anything else is asked of no database. */
const SLUG = /^[a-z0-9-]{1,90}$/
