export interface TestCount {
  readonly passed: number;
  readonly failed: number;
  readonly skipped: number;
}

export declare const NOTHING: TestCount;
export declare function countVitest(file: string, exitCode: number): TestCount;
export declare function countPlaywright(file: string, exitCode: number): TestCount;
