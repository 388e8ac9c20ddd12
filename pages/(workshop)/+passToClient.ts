export { passToClient }

// The masthead marks where the reader is; on these pages it comes alive in the browser, which has to know it too.
const passToClient = ['urlPathname']
