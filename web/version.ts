declare const __DRIFTBOOK_VERSION__: string;

/** Version of this build, such as `0.1.0+3fa2c1b`. */
export const version: string = __DRIFTBOOK_VERSION__;
