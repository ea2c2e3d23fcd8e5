import { newPartId } from '@shared/layout/new-ids'
import type { LayoutDocument, ShaftSection } from '@shared/layout/layout-document'
import type { Operation } from '@shared/layout/operations'

export interface SectionEdit {
  label: string
  operations: Operation[]
  /** The section to select afterwards. */
  selectId: string | null
}

const NEW_LENGTH_MM = 40
const FIRST_DIAMETER_MM = 50

/** A new section takes the diameters of the one beside it, so that the shaft stays one piece. */
export function addSection(layout: LayoutDocument, index: number): SectionEdit {
  const { sections } = layout.shaft
  const beside = sections[index - 1] ?? sections[index]
  const id = newPartId('section')
  return {
    label: `Add section ${index + 1}`,
    selectId: id,
    operations: [
      {
        type: 'add',
        collection: 'sections',
        index,
        item: {
          id,
          lengthMm: NEW_LENGTH_MM,
          outerDiameterMm: beside?.outerDiameterMm ?? FIRST_DIAMETER_MM,
          boreDiameterMm: beside?.boreDiameterMm ?? 0,
          roughnessRzUm: beside?.roughnessRzUm ?? 4,
        },
      },
    ],
  }
}

export function duplicateSection(layout: LayoutDocument, section: ShaftSection): SectionEdit {
  const index = layout.shaft.sections.indexOf(section)
  const id = newPartId('section')
  return {
    label: `Duplicate section ${index + 1}`,
    selectId: id,
    operations: [{ type: 'add', collection: 'sections', index: index + 1, item: { ...section, id } }],
  }
}

export function removeSection(layout: LayoutDocument, section: ShaftSection): SectionEdit {
  return {
    label: `Delete section ${layout.shaft.sections.indexOf(section) + 1}`,
    selectId: null,
    operations: [{ type: 'remove', target: { kind: 'section', id: section.id } }],
  }
}

export function moveSection(layout: LayoutDocument, section: ShaftSection, by: 1 | -1): SectionEdit {
  const index = layout.shaft.sections.indexOf(section)
  return {
    label: `Move section ${index + 1} to the ${by > 0 ? 'right' : 'left'}`,
    selectId: section.id,
    operations: [{ type: 'reorder', target: { kind: 'section', id: section.id }, index: index + by }],
  }
}
