export { SESSION_COOKIES, sessionCookieName }

/** Under HTTPS the `__Host-` prefix makes browsers refuse the cookie from anywhere but this host over HTTPS. */
function sessionCookieName(secure: boolean): string {
  return secure ? '__Host-cc' : 'cc'
}

/** Every name a session cookie of ours can have; a request with one of them is not a plain visitor's. */
const SESSION_COOKIES = ['__Host-cc', 'cc']
