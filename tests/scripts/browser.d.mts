export declare function findBrowser(): string | undefined;
export declare function ensureBrowser(): Promise<boolean>;
