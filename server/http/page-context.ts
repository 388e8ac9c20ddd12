import type { FieldProblem } from '../errors.ts'
import type { ServiceContext } from '../context.ts'
import type { MemberRole } from '#shared/vocabulary/roles.ts'

/** What a form held when it was refused, so that the page can show it again with words at each field. */
export interface FormState {
  values: Record<string, string>
  problems: FieldProblem[]
  message: string
}

/** The signed-in reader as pages see them. */
export interface PageReader {
  id: string
  name: string
  role: MemberRole
  verified: boolean
  /** Edits waiting at the review desk; 0 for who is no moderator. */
  waiting: number
}

export type Sheet = 'day' | 'night' | null

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- Vike types its page context by this namespace
  namespace Vike {
    interface PageContext {
      reader: PageReader | null
      form: FormState | null
      /** Status under which a refused form is shown again. */
      formStatus: number | undefined
      sheet: Sheet
      club: string
      requestId: string
      origin: string
      query: Record<string, string>
    }
    interface PageContextServer {
      ctx: ServiceContext
    }
  }
}
