/** The release, put in by the build. */
declare const VERSION: string;
