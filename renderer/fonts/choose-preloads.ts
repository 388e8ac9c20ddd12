export { choosePreloads }

interface PageAsset {
  assetType: string | null
  src: string
  inject: false | 'HTML_BEGIN' | 'HTML_END'
}

/** What nearly every page sets in type at once. The other files wait until a page holds a character of theirs. */
const FIRST = ['camber-read-text.', 'camber-read-text-signs.', 'camber-read-sign.', 'camber-work.']

/** The layout brings `reading.css`; a page that needs none of its guides and instruments brings `plain-pages.css` instead. */
const READING = /styles[/_]reading\W/
const PLAIN_PAGES = /styles[/_]plain-pages\W/

/**
 * What a page asks the browser to fetch early: of the fonts, which Vike would preload all, those that most pages need; of the
 * scripts, also the small pieces of the entry, which would otherwise be found one after the other; and of the two stylesheets
 * that can begin a page, one.
 * https://vike.dev/injectFilter
 */
function choosePreloads(assets: PageAsset[]): void {
  const plain = assets.some(({ src }) => PLAIN_PAGES.test(src))
  for (const asset of assets) {
    const file = asset.src.split('/').at(-1) ?? ''
    if (asset.assetType === 'font' && !FIRST.some((name) => file.startsWith(name))) asset.inject = false
    if (asset.assetType === 'script' && asset.inject === false) asset.inject = 'HTML_END'
    if (plain && READING.test(asset.src)) asset.inject = false
  }
}
