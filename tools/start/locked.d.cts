export function whyStale(
  wanted: { packages?: Record<string, { version?: string; optional?: boolean }> },
  installed: { packages?: Record<string, { version?: string }> } | undefined,
): string | undefined;
