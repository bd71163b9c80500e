/** The part of odex that the tests use: its own sources do not pass this project's compiler settings. */
export declare class Solver {
  constructor(dimension: number)
  absoluteTolerance: number
  relativeTolerance: number
  initialStepSize: number
  solve(
    slope: (x: number, y: number[]) => number[], from: number, start: number[], to: number,
    output?: (step: number, from: number, to: number, y: number[]) => unknown,
  ): { y: number[] }
}
