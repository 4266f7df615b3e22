const FILE_TITLE_MAX = 80

/** A house's name as a file can have it on any system. */
export function fileTitle(houseName: string): string {
  const title = houseName
    .slice(0, FILE_TITLE_MAX)
    .replace(/[\\/:*?"<>|\p{Cc}\p{Surrogate}]/gu, ' ')
    .replace(/\s+/g, ' ')
    .replace(/^[. ]+|[. ]+$/g, '')
  return title === '' ? 'House' : title
}
