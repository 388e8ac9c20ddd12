export { headingsOf }

import type { Heading } from '../rendering/index.ts'

/** The headings in stored HTML, for the thumb index. The renderer gives every heading an id. */
function headingsOf(html: string): Heading[] {
  return [...html.matchAll(/<h([1-6])\b[^>]*\bid="([^"]*)"[^>]*>([\s\S]*?)<\/h\1>/g)].map((match) => ({
    level: Number(match[1]),
    id: plain(match[2]!),
    text: plain(match[3]!.replace(/<annotation[\s\S]*?<\/annotation>|<[^>]*>/g, '')).replace(/\s+/g, ' ').trim(),
  }))
}

const entities: Record<string, string> = { lt: '<', gt: '>', quot: '"', '#39': "'", nbsp: ' ', amp: '&' }

function plain(html: string): string {
  return html.replace(/&(lt|gt|quot|#39|nbsp|amp);/g, (_, name: string) => entities[name]!)
}
