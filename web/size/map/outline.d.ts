/** What the build makes of a file of land. */
declare module '*.json?outline' {
  export const shores: import('./land').Outline;
}
