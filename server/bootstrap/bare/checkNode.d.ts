export function atLeast(version: string, range: string): boolean;
export function checkNode(version?: string, range?: string): void;
