/**
 * Files of shared/ whose behaviour is held by a test at another place: the door they are used through says
 * more about them than a test of their own would.
 */
export const coveredElsewhere: Readonly<Record<string, string>> = {};
