/** The file name that a Content-Disposition header gives, or null when it gives none. */
export function fileNameOf(disposition: string | null): string | null {
  return /filename="([^"\\/]+)"/.exec(disposition ?? '')?.[1] ?? null;
}
