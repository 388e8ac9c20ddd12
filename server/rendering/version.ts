export { RENDERER_VERSION }

/**
 * Raise this whenever the same Markdown would give other HTML, so that stored editions are rendered again.
 */
const RENDERER_VERSION = 1
