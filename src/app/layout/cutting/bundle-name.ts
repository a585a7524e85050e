const NAME_MOST = 60;

/** A file name for the bundle of a version that every system takes: "ferry-hall-lantern-v7.zip". */
export function bundleName(title: string, version: number): string {
  const words = title
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .slice(0, NAME_MOST)
    .replace(/^-+|-+$/g, '');
  return `${words === '' ? 'layout' : words}-v${version}.zip`;
}
