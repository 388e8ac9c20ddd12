export { splitLinks }
export type { TextPart }

interface TextPart {
  text: string
  /** Path on this site, where the text is a link to it. */
  href?: string
}

/**
 * Takes a plain text apart at the links to this site. Only those become links, and by their path alone, so that they
 * work by whatever name the reader reached this server.
 */
function splitLinks(text: string, origin: string): TextPart[] {
  return text.split(/(https?:\/\/[^\s<>"]+)/).flatMap((part): TextPart[] => {
    if (part === '') return []
    if (!URL.canParse(part) || !/^https?:\/\//.test(part)) return [{ text: part }]
    const url = new URL(part)
    return [url.origin === origin ? { text: part, href: `${url.pathname}${url.search}` } : { text: part }]
  })
}
