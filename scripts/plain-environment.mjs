const KEPT =
  /^(?:PATH|HOME|USER|LOGNAME|SHELL|LANG|LC_.*|TZ|TMPDIR|TEMP|TMP|SSL_CERT_.*|NODE_EXTRA_CA_CERTS)$/

/** The environment without what a test runner or npm adds: it must not change what our programs do. */
export function plainEnvironment() {
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => KEPT.test(name)))
}
