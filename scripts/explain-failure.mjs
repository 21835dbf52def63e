const MEANINGS = [
  [
    /ENOSPC|No space left|disk is full|Errcode: 28|error (?:number )?28\b|You don't have enough free space/i,
    'The disk is full: make room (the packages need about 1.5 GB, the database 0.2 GB) and run the same command again.',
  ],
  [
    /EAI_AGAIN|ENOTFOUND|ETIMEDOUT|ECONNREFUSED|ECONNRESET|ENETUNREACH|network (?:request|timeout)|Temporary failure resolving|Could not connect|Failed to fetch|Unable to connect/i,
    'The network cannot be reached: check the connection and run the same command again.',
  ],
  [
    /Could not get lock|dpkg frontend lock|Unable to acquire the dpkg/i,
    'Another program is installing packages: wait until it is done and run the same command again.',
  ],
  [
    /dpkg was interrupted/i,
    'An earlier installation was cut short: run "sudo dpkg --configure -a", then the same command again.',
  ],
  [
    /Unable to locate package|has no installation candidate/i,
    'This system does not offer the package: MariaDB 10.11 or newer and Chromium have to be installed by hand.',
  ],
  [
    /EINTEGRITY|integrity checksum failed/i,
    'A package arrived damaged: run "npm cache verify", then the same command again.',
  ],
  [
    /npm ci.*in sync|Invalid: lock file/i,
    'package.json and package-lock.json do not belong together: check both out again, or run "npm install".',
  ],
  [
    /EADDRINUSE|address already in use/i,
    'The port is in use by another program: free it, or choose another with --port.',
  ],
  [
    /EACCES|EPERM|EROFS|Permission denied|Read-only file system/i,
    'This user may not write here: give the project folder to the user who runs it.',
  ],
]

/** What the last words of a failed program mean, in one sentence that says what to do; null when unknown. @param {string} words */
export function explainFailure(words) {
  for (const [pattern, sentence] of MEANINGS) if (pattern.test(words)) return sentence
  return null
}
