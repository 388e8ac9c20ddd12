export { describeDemoSignIns, ensureDemoSignIns }

import { readFileSync } from 'node:fs'
import { and, eq, isNull } from 'drizzle-orm'
import { parse } from 'yaml'
import { z } from 'zod'
import type { App } from '../context.ts'
import { members } from '../db/schema/index.ts'
import { MEMBER_ROLES, roleNames } from '#shared/vocabulary/roles.ts'

const DemoMembers = z.array(
  z.object({
    key: z.string(),
    name: z.string(),
    role: z.enum(MEMBER_ROLES),
    demoEmail: z.email(),
    demoPassword: z.string().min(15),
  }),
)

const membersFile = new URL('../../content/members.yaml', import.meta.url)

function readDemoMembers(): z.infer<typeof DemoMembers> {
  return DemoMembers.parse(parse(readFileSync(membersFile, 'utf8')))
}

/** Lets the invented members sign in, to try the product out. Never in production mode; safe to repeat. */
async function ensureDemoSignIns(app: App): Promise<void> {
  if (app.config.production) throw new Error('Demo sign-ins are never made in production mode.')
  await Promise.all(
    readDemoMembers().map(async ({ key, demoEmail, demoPassword }) => {
      const without = and(eq(members.key, key), isNull(members.passwordHash))
      const [member] = await app.db.select({ id: members.id }).from(members).where(without)
      if (member === undefined) return
      const passwordHash = await app.passwords.hash(demoPassword)
      await app.db
        .update(members)
        .set({ email: demoEmail, passwordHash, emailVerifiedAt: app.clock() })
        .where(without)
    }),
  )
}

/** The demo sign-ins as lines to print at start. */
function describeDemoSignIns(): string {
  const rows = readDemoMembers().map(({ role, demoEmail, demoPassword }) => [roleNames[role], demoEmail, demoPassword])
  const widths = [0, 1].map((column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)))
  const lines = rows.map((row) => `  ${row.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join('  ')}`)
  return ['Sign in to try it out (role, e-mail, password):', ...lines].join('\n')
}
