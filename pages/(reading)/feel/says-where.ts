export { saysWhere }

import { complaintWords } from '#shared/vocabulary/complaints.ts'
import type { Phase } from '#shared/vocabulary/phases.ts'
import type { FeelComplaint } from '#shared/feel/rank-changes.ts'

const places: Record<Phase, string> = {
  entry: 'at corner entry',
  middle: 'in mid-corner',
  exit: 'at corner exit',
  straight: 'on the straight',
  bumps: 'over bumps',
  jumps: 'over jumps',
}

/** “Pushes at corner entry”. */
function saysWhere(complaint: FeelComplaint): string {
  return `${complaintWords(complaint)} ${places[complaint.phase]}`
}
