export function lockFolder(folder: string, purpose: string): Promise<{ release: () => Promise<void> } | null>;
