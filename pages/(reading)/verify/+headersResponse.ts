export { headersResponse }

// This page's address holds a secret, so no other site may learn it as where a reader came from. Not `no-referrer`:
// with that, browsers send `Origin: null` along with the page's own form, which then looks as if another site sent it.
const headersResponse = { 'Referrer-Policy': 'same-origin' }
