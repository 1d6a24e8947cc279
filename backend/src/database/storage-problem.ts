/** What the system or the database says when a folder cannot be used, with what a person can do about it. */
const CAUSES: readonly [RegExp, string][] = [
  [/^(ENOSPC|EDQUOT|SQLITE_FULL)$/, 'The disk is full. Free some space on it.'],
  [
    /^(EACCES|EPERM|EROFS|SQLITE_READONLY.*|SQLITE_CANTOPEN.*|SQLITE_PERM)$/,
    'This user may not write there. Change the rights of the folder, or choose another.',
  ],
  [
    /^(ENOTDIR|EEXIST|ENOENT|EISDIR|ENAMETOOLONG)$/,
    'It is no folder and cannot become one. Choose another place.',
  ],
  [
    /^(SQLITE_CORRUPT.*|SQLITE_NOTADB)$/,
    'The database file in it is damaged. Put a backup of the folder in its place.',
  ],
  [/^(EIO|SQLITE_IOERR.*)$/, 'The disk does not answer as it should. Look at the system log.'],
];

/** Why the storage cannot be used, in a person's words; null for any other error. */
export function storageProblem(error: unknown): string | null {
  const code = error instanceof Error && 'code' in error && typeof error.code === 'string' ? error.code : '';
  return CAUSES.find(([codes]) => codes.test(code))?.[1] ?? null;
}

/** The same with the folder named, for the person who starts the server. */
export function folderProblem(error: unknown, dataDir: string): string | null {
  const problem = storageProblem(error);
  return problem && `The data folder ${dataDir} (STAGEYARD_DATA) cannot be used. ${problem}`;
}
