export { isUuid }

/** Whether a text from an address or a form can be asked for as an id at all. */
function isUuid(text: string): boolean {
  return /^[0-9a-f]{8}-(?:[0-9a-f]{4}-){3}[0-9a-f]{12}$/i.test(text)
}
