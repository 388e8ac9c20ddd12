export { preloadFirstFonts }

interface PageAsset {
  assetType: string | null
  src: string
  inject: false | 'HTML_BEGIN' | 'HTML_END'
}

/** What nearly every page sets in type at once. The other files wait until a page holds a character of theirs. */
const FIRST = ['camber-read-text.', 'camber-read-text-signs.', 'camber-read-sign.', 'camber-work.']

/**
 * Vike preloads every font that a stylesheet names; this takes out those that most pages never need.
 * https://vike.dev/injectFilter
 */
function preloadFirstFonts(assets: PageAsset[]): void {
  for (const asset of assets) {
    if (asset.assetType !== 'font') continue
    const file = asset.src.split('/').at(-1) ?? ''
    if (!FIRST.some((name) => file.startsWith(name))) asset.inject = false
  }
}
