/** Put in by the build. */
declare const HEADTREE_VERSION: string;

/** The version of this script. */
export const version = HEADTREE_VERSION;
