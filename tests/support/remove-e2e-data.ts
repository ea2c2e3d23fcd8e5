import { rmSync } from 'node:fs'

export default function removeE2eData() {
  if (process.env.E2E_DATA_DIR) rmSync(process.env.E2E_DATA_DIR, { recursive: true, force: true })
}
