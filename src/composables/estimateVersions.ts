/**
 * Which versions of the estimate this page has seen: by reading it whole, or as the answer to its own write. A version that it has not seen is somebody
 * else's, and the estimate is read again; without this every save of our own would cost a read of all lines.
 */
export function createEstimateVersions(firstRead: number) {
  let readUpTo = firstRead
  let announced = firstRead
  const own = new Set<number>()

  return {
    /** An answer to our own write. */
    wrote(version: number): void {
      own.add(version)
      announced = Math.max(announced, version)
    },
    /** A live event, or an answer that shows how far the estimate is. */
    heard(version: number): void {
      announced = Math.max(announced, version)
    },
    /** A read that began before our last write was answered: it doesn't know of it. */
    isOld(version: number): boolean {
      return version < Math.max(readUpTo, ...own)
    },
    /** The whole was read at this version, and with it all that was announced before. */
    read(version: number): void {
      readUpTo = version
      announced = version
      own.clear()
    },
    /** Whether there is a version that we have neither read nor written. */
    isBehind(): boolean {
      while (own.delete(readUpTo + 1)) readUpTo += 1
      return readUpTo < announced
    },
  }
}
