export { pageMember }

/** Id of the member this page was made for, which the masthead says; null for a visitor's page. */
function pageMember(): string | null {
  return document.querySelector<HTMLElement>('.mast[data-member]')?.dataset['member'] || null
}
