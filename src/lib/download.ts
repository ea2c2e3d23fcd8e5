import { errorFromBody, HttpError } from './http-client'

/** Saves what an address answers. Fetched rather than linked, so that a refusal is shown and not saved. */
export async function download(path: string, fallbackName: string): Promise<void> {
  let response: Response
  try {
    response = await fetch(path)
  } catch {
    throw new HttpError(0, 'unavailable', 'No connection to the server. Check the line and try again.')
  }
  if (!response.ok) {
    const body: unknown = await response.json().catch(() => null)
    throw errorFromBody(response.status, body)
  }
  const name = fileNameOf(response.headers.get('content-disposition')) ?? fallbackName
  saveBlob(await response.blob(), name)
}

export function saveBlob(blob: Blob, fileName: string): void {
  const url = URL.createObjectURL(blob)
  const link = document.createElement('a')
  link.href = url
  link.download = fileName
  link.click()
  // The browser has taken hold of the blob once the click is handled.
  setTimeout(() => URL.revokeObjectURL(url), 0)
}

function fileNameOf(disposition: string | null): string | null {
  const encoded = disposition && /filename\*=UTF-8''([^;]+)/i.exec(disposition)?.[1]
  if (encoded) {
    try {
      return decodeURIComponent(encoded)
    } catch {
      return null
    }
  }
  return (disposition && /filename="?([^";]+)"?/i.exec(disposition)?.[1]) || null
}
