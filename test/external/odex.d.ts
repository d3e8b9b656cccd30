/** The part of odex that the tests use; the package ships its source without strict types. */
declare module 'odex' {
  export type Derivative = (x: number, y: number[]) => number[];

  export class Solver {
    constructor(dimension: number);
    maxSteps: number;
    initialStepSize: number;
    maxExtrapolationColumns: number;
    relativeTolerance: number | number[];
    absoluteTolerance: number | number[];
    solve(f: Derivative, x: number, y: number[], xEnd: number): { y: number[]; outcome: number };
  }

  export const Outcome: { readonly Converged: number };
}
