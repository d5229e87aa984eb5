/** The moment at which every browser journey happens, for the server (and for the page: `page.clock`). */
export const JOURNEY_NOW = '2027-03-10T06:00:00Z';
