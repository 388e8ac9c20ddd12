export { goToField }

/** Brings a field on the screen and puts the cursor in it, opening what it is folded into. */
function goToField(id: string): void {
  const field = document.getElementById(id)
  if (field === null) return
  // On a phone only one leaf is shown, and this is what turns to it.
  location.hash = `#${id}`
  for (let part = field.closest('details'); part !== null; part = part.parentElement?.closest('details') ?? null) part.open = true
  field.focus()
}
