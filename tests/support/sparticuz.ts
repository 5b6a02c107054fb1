/** Unpacks the packaged Chromium and answers its path; its own launch flags are not for us (they hold --single-process). */
export async function chromium(): Promise<string> {
  const { default: packaged } = await import('@sparticuz/chromium');
  return packaged.executablePath();
}
