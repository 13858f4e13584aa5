/**
 * A folder name for a job: key, then the label in lower case with only a–z, 0–9 and single hyphens, at
 * most 60 characters. Safe on every common file system: no reserved device name (the key comes first),
 * no trailing dot or blank, nothing that differs only in case (keys are unique in upper case).
 */
export function jobFolderName(jobKey: string, label: string): string {
  const slug = label
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '');
  return `${jobKey}${slug === '' ? '' : '-'}${slug}`.slice(0, 60).replace(/-+$/, '');
}
