/** For files whose name changes with their content. */
export const FOREVER = 'public, max-age=31536000, immutable'
/** For what must be asked after each time: the page that names those files. */
export const ASK_EACH_TIME = 'no-cache'
