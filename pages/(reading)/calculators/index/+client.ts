import { findAmong } from '../find-calculators.ts'
import { foundWords } from '../found-words.ts'

// The server answers the same form; here the shelf follows the typing, without Vue.
const form = document.querySelector<HTMLFormElement>('.cl-find')
const field = form?.querySelector<HTMLInputElement>('input[name=find]')
const entries = [...document.querySelectorAll<HTMLElement>('.cl-list li')].map((element) => ({
  element,
  words: element.dataset.words ?? '',
}))

function show() {
  const question = field?.value ?? ''
  const found = new Set(findAmong(entries, question))
  for (const entry of entries) entry.element.hidden = !found.has(entry)
  for (const part of document.querySelectorAll<HTMLElement>('.cl-part'))
    part.hidden = part.querySelector('li:not([hidden])') === null
  const says = document.querySelector('.cl-says')
  if (says !== null) says.textContent = foundWords(question, found.size)
  const none = document.querySelector<HTMLElement>('.cl-none')
  if (none !== null) none.hidden = found.size > 0
}

field?.addEventListener('input', show)
form?.addEventListener('submit', (event) => {
  event.preventDefault()
  const question = field?.value.trim() ?? ''
  history.replaceState(history.state, '', question === '' ? location.pathname : `?find=${encodeURIComponent(question)}`)
  show()
})
