export { copyText }

/**
 * Puts text on the clipboard; false when the browser does not allow it. On an unencrypted connection, as at the
 * track, there is no clipboard to write to, so a field that holds the text is marked and copied the old way.
 */
async function copyText(text: string, field?: HTMLInputElement | HTMLTextAreaElement): Promise<boolean> {
  try {
    await navigator.clipboard.writeText(text)
    return true
  } catch {
    const helper = field ?? document.body.appendChild(document.createElement('textarea'))
    if (field === undefined) helper.value = text
    helper.select()
    const copied = document.execCommand('copy')
    if (field === undefined) helper.remove()
    return copied
  }
}
