export { ORDERS, orderNames, orderOf, sortTries }
export type { TryOrder }

const ORDERS = ['best', 'quickest', 'least'] as const
type TryOrder = (typeof ORDERS)[number]

const orderNames: Record<TryOrder, string> = { best: 'Best bet', quickest: 'Quickest', least: 'Gives up least' }

function orderOf(text: string | undefined): TryOrder {
  return ORDERS.find((order) => order === text) ?? 'best'
}

/** The list in the order asked for; where that says nothing, the best bet stands first. `tries` come best first. */
function sortTries<T extends { minutes: number; cost: number }>(tries: readonly T[], order: TryOrder): T[] {
  if (order === 'quickest') return [...tries].sort((a, b) => a.minutes - b.minutes)
  if (order === 'least') return [...tries].sort((a, b) => a.cost - b.cost)
  return [...tries]
}
