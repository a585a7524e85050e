/** What wrote a file; the version is that of package.json (a test holds them together). */
export const PROGRAM = { name: 'Staveloom', version: '0.1.0' } as const;
