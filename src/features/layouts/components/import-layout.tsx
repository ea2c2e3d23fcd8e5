import { type DragEvent, useRef, useState } from 'react'
import { Banner } from '@/components/banner'
import { Button } from '@/components/button'
import { Icon } from '@/components/icon'
import { HttpError, messageOf } from '@/lib/http-client'
import { readLayoutFile, type ReadLayoutFile } from '../read-layout-file'
import { ProblemList } from './problem-list'

interface ImportLayoutProps {
  read: ReadLayoutFile | null
  error: Error | null
  onRead: (read: ReadLayoutFile) => void
}

/** Choose or drop a layout file; what is wrong with it is listed with its place in the file. */
export function ImportLayout({ read, error, onRead }: ImportLayoutProps) {
  const input = useRef<HTMLInputElement>(null)
  const [isOver, setIsOver] = useState(false)
  const take = async (file: File | undefined) => {
    if (file) onRead(await readLayoutFile(file))
  }
  const drop = (event: DragEvent) => {
    event.preventDefault()
    // Stopped, so that the page under the dialog does not take the file as well.
    event.stopPropagation()
    setIsOver(false)
    void take(event.dataTransfer.files[0])
  }
  const serverProblems = error instanceof HttpError ? Object.entries(error.fields) : []

  return (
    <div className="grid gap-4">
      <div
        className={`grid justify-items-center gap-3 border border-dashed px-6 py-8 text-center ${
          isOver ? 'border-steel bg-steel-soft' : 'border-edge'
        }`}
        onDragOver={(event) => {
          event.preventDefault()
          setIsOver(true)
        }}
        onDragLeave={() => setIsOver(false)}
        onDrop={drop}
      >
        <Icon name="upload" className="size-6 text-quiet" />
        <p className="text-sm">
          Drop a layout file here, or{' '}
          <Button size="sm" onClick={() => input.current?.click()}>
            Choose a file
          </Button>
        </p>
        <input
          ref={input}
          type="file"
          accept=".json,application/json"
          aria-label="Layout file"
          className="sr-only"
          tabIndex={-1}
          onChange={(event) => {
            void take(event.target.files?.[0])
            // The same file can be chosen again after it was mended.
            event.target.value = ''
          }}
        />
      </div>
      {read?.ok && (
        <Banner tone="good" title={read.layoutName}>
          {read.fileName} can be imported.
        </Banner>
      )}
      {read && !read.ok && (
        <Banner tone="bad" title={`${read.fileName} cannot be imported`}>
          <ProblemList problems={read.problems} />
        </Banner>
      )}
      {error && (
        <Banner tone="bad" title={messageOf(error)}>
          {serverProblems.length > 0 && (
            <ProblemList problems={serverProblems.map(([path, message]) => ({ path, message }))} />
          )}
        </Banner>
      )}
    </div>
  )
}
