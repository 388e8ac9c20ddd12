export { readContent, contentFolder }
export type { BookContent, GuideFile }

import { readFile, readdir } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'
import { parse } from 'yaml'
import { z } from 'zod'
import { GuideContent } from '#shared/schemas/guide-content.ts'
import { AXLES } from '#shared/vocabulary/axles.ts'
import { MEMBER_ROLES } from '#shared/vocabulary/roles.ts'

const contentFolder = fileURLToPath(new URL('../../content', import.meta.url))

const Chapter = z.strictObject({ letter: z.string().regex(/^[A-Z]$/), name: z.string(), about: z.string() })
const Member = z.strictObject({
  key: z.string(),
  name: z.string(),
  role: z.enum(MEMBER_ROLES),
  about: z.string(),
  demoEmail: z.email(),
  demoPassword: z.string().min(15),
})
const Adjustable = z.strictObject({
  key: z.string(),
  name: z.string(),
  axle: z.enum(AXLES),
  unit: z.string(),
  up: z.string(),
  down: z.string(),
  smallStep: z.number().positive(),
  minutes: z.number().int(),
  tools: z.array(z.string()),
  opensCar: z.boolean(),
  guide: z.string().nullable(),
  about: z.string(),
})
const Term = z.strictObject({
  key: z.string(),
  term: z.string(),
  short: z.string(),
  long: z.string().default(''),
  standard: z.string().default(''),
})
const FirstLooks = z.record(
  z.string().regex(/^\w+\.\w+\.(more|less)$/, 'A complaint is written as entry.steering.more.'),
  z.array(z.string().min(10).max(160)).min(2).max(4),
)
const Wanted = z.strictObject({ chapter: z.string(), title: z.string(), why: z.string() })
const GuideHead = z.looseObject({
  chapter: z.string(),
  number: z.number().int(),
  author: z.string(),
  approver: z.string(),
})

interface GuideFile {
  slug: string
  chapter: string
  number: number
  author: string
  approver: string
  content: GuideContent
}

interface BookContent {
  chapters: z.infer<typeof Chapter>[]
  members: z.infer<typeof Member>[]
  adjustables: z.infer<typeof Adjustable>[]
  glossary: z.infer<typeof Term>[]
  wanted: z.infer<typeof Wanted>[]
  /** What to look at before anything is changed, by complaint. */
  firstLooks: z.infer<typeof FirstLooks>
  guides: GuideFile[]
}

/**
 * Reads and checks everything in `content/`.
 * @throws Error that names the file and what is wrong in it
 */
async function readContent(folder = contentFolder): Promise<BookContent> {
  const slugs = (await readdir(`${folder}/guides`)).filter((name) => name.endsWith('.md')).sort()
  return {
    chapters: await readList(folder, 'chapters.yaml', Chapter),
    members: await readList(folder, 'members.yaml', Member),
    adjustables: await readList(folder, 'adjustables.yaml', Adjustable),
    glossary: await readList(folder, 'glossary.yaml', Term),
    wanted: await readList(folder, 'wanted.yaml', Wanted),
    firstLooks: await readYaml(folder, 'first-looks.yaml', FirstLooks),
    guides: await Promise.all(slugs.map((name) => readGuide(folder, name))),
  }
}

async function readList<S extends z.ZodType>(folder: string, name: string, row: S): Promise<z.infer<S>[]> {
  return readYaml(folder, name, z.array(row))
}

async function readYaml<S extends z.ZodType>(folder: string, name: string, schema: S): Promise<z.infer<S>> {
  const parsed: unknown = parse(await readFile(`${folder}/${name}`, 'utf8'))
  return checked(name, schema, parsed)
}

async function readGuide(folder: string, name: string): Promise<GuideFile> {
  const text = await readFile(`${folder}/guides/${name}`, 'utf8')
  const [, front, body] = /^---\n([\s\S]*?)\n---\n([\s\S]*)$/.exec(text) ?? []
  if (front === undefined || body === undefined) throw new Error(`content/guides/${name}: it has no front matter`)
  const { chapter, number, author, approver, ...fields } = checked(name, GuideHead, parse(front))
  const content = checked(name, GuideContent, { ...fields, body: body.trim() + '\n' })
  return { slug: name.replace(/\.md$/, ''), chapter, number, author, approver, content }
}

function checked<S extends z.ZodType>(name: string, schema: S, value: unknown): z.infer<S> {
  const result = schema.safeParse(value)
  if (result.success) return result.data
  const problems = result.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`)
  throw new Error(`content: ${name} does not fit\n${problems.join('\n')}`)
}
