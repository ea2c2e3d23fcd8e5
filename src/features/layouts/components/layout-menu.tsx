import { useState } from 'react'
import { Icon } from '@/components/icon'
import { Menu } from '@/components/menu'
import { showToast } from '@/components/toast-store'
import { download } from '@/lib/download'
import { messageOf } from '@/lib/http-client'
import type { LayoutSummary } from '@shared/protocol/layouts'
import { useCreateLayout, useUpdateLayout } from '../api/change-layouts'
import { RenameLayoutDialog } from './rename-layout-dialog'

/** What one may do with a layout from the list; only shown to roles that may. */
export function LayoutMenu({ layout }: { layout: LayoutSummary }) {
  const { id, workspaceId, name, isArchived } = layout
  const [isRenaming, setIsRenaming] = useState(false)
  const create = useCreateLayout(workspaceId)
  const update = useUpdateLayout(workspaceId, id)
  const onError = (error: Error) => showToast(messageOf(error), 'bad')

  const duplicate = () =>
    create.mutate(
      { from: { kind: 'layout', layoutId: id } },
      { onSuccess: (copy) => showToast(`“${copy.name}” was made`), onError },
    )
  const exportFile = () =>
    download(`/api/layouts/${id}/export`, `${name}.layout.json`).catch((error: unknown) =>
      showToast(messageOf(error), 'bad'),
    )
  const setArchived = (value: boolean) =>
    update.mutate(
      { isArchived: value },
      {
        onSuccess: () => showToast(value ? `“${name}” is in the archive` : `“${name}” is back in the list`),
        onError,
      },
    )

  return (
    <>
      <Menu
        label={`Actions for ${name}`}
        buttonClassName="grid size-8 place-items-center rounded-md text-quiet hover:bg-steel-soft hover:text-ink"
        button={<Icon name="more" />}
        items={[
          { label: 'Rename and project', icon: 'edit', onSelect: () => setIsRenaming(true) },
          { label: 'Duplicate', icon: 'copy', onSelect: duplicate },
          { label: 'Export layout file', icon: 'download', onSelect: () => void exportFile() },
          { kind: 'separator' },
          isArchived
            ? { label: 'Take out of the archive', icon: 'restore', onSelect: () => setArchived(false) }
            : { label: 'Archive', icon: 'archive', onSelect: () => setArchived(true) },
        ]}
      />
      {isRenaming && <RenameLayoutDialog layout={layout} onClose={() => setIsRenaming(false)} />}
    </>
  )
}
