/** Put in by the build, from package.json. */
declare const TENUITY_VERSION: string;

export const VERSION: string = TENUITY_VERSION;
