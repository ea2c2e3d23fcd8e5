/** Mails to the team about review, freezing and withdrawal; one address a mail. */
import { membersOf } from '../accounts/accounts.repository'
import type { Queries } from '../database/open-database'
import type { Site } from '../http/origin-check'
import type { Mailer } from '../mail/mailer'
import { type MailParts, renderMail } from '../mail/templates'
import type { StoredRelease } from './release-storage'
import type { ReviewedLayout } from './releases.repository'

export interface ReleaseMails {
  reviewAsked(layout: ReviewedLayout, byName: string, note: string): void
  frozen(release: StoredRelease): void
  withdrawn(release: StoredRelease, byName: string, reason: string): void
}

export function createReleaseMails(
  queries: Queries,
  mailer: Pick<Mailer, 'sendMail'>,
  site: Pick<Site, 'publicUrl'>,
): ReleaseMails {
  const tellTeam = (workspaceId: string, parts: MailParts) => {
    const content = renderMail(parts)
    for (const member of membersOf(queries, workspaceId)) mailer.sendMail({ to: member.email, ...content })
  }
  const pageOf = (release: StoredRelease) =>
    `${site.publicUrl}/w/${release.workspaceId}/releases/${release.id}`

  return {
    reviewAsked(layout, byName, note) {
      const title = `${layout.document.name}, revision ${layout.revisionLetter}`
      tellTeam(layout.workspaceId, {
        subject: `Review asked: ${title}`,
        paragraphs: [
          `${byName} asks for review of ${title}, in ${layout.workspaceName}.`,
          ...(note === '' ? [] : [`Note: ${note}`]),
        ],
        link: {
          label: 'Open the layout',
          url: `${site.publicUrl}/w/${layout.workspaceId}/layouts/${layout.id}`,
        },
      })
    },

    frozen(release) {
      const title = `${release.layoutName}, revision ${release.revisionLetter}`
      const deviations = release.acceptances.length
      tellTeam(release.workspaceId, {
        subject: `Released: ${title}`,
        paragraphs: [
          `${release.frozenByName} froze ${title}, in ${release.workspaceName}. It no longer changes.`,
          deviations === 0
            ? 'No finding fails.'
            : `${deviations === 1 ? 'One failing finding was' : `${deviations} failing findings were`} accepted with reasons; they stand on the release sheet.`,
          ...(release.note === '' ? [] : [`Note: ${release.note}`]),
          `Document ${release.documentHash}, engine ${release.engineVersion}.`,
          ...release.results.cautions.slice(0, 1),
        ],
        link: { label: 'Open the release', url: pageOf(release) },
      })
    },

    withdrawn(release, byName, reason) {
      const title = `${release.layoutName}, revision ${release.revisionLetter}`
      tellTeam(release.workspaceId, {
        subject: `Withdrawn: ${title}`,
        paragraphs: [
          `${byName} withdrew the release of ${title}, in ${release.workspaceName}. Do not build from it.`,
          `Reason: ${reason}`,
        ],
        link: { label: 'Open the release', url: pageOf(release) },
      })
    },
  }
}
