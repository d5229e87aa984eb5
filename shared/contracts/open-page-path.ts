/** The page that a telephone opens; the key stands behind it in the query. By itself: every screen's first load knows it. */
export const OPEN_PAGE_PATH = '/open';
