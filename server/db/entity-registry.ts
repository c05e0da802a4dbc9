import { AccountLink } from '../features/accounts/account-link.entity.ts'
import { Person } from '../features/accounts/person.entity.ts'
import { Session } from '../features/accounts/session.entity.ts'
import { BuildInvitation } from '../features/builds/build-invitation.entity.ts'
import { BuildPhoto } from '../features/builds/build-photo.entity.ts'
import { Build } from '../features/builds/build.entity.ts'
import { Delivery } from '../features/notices/delivery.entity.ts'
import { NoticeChoice } from '../features/notices/notice-choice.entity.ts'
import { Notice } from '../features/notices/notice.entity.ts'
import { Webhook } from '../features/notices/webhook.entity.ts'
import { NumberTick } from '../features/numbers/number-tick.entity.ts'
import { Erratum } from '../features/publication/erratum.entity.ts'
import { Publication } from '../features/publication/publication.entity.ts'
import { PublishedFile } from '../features/publication/published-file.entity.ts'
import { PushVersion } from '../features/push/push-version.entity.ts'
import { Push } from '../features/push/push.entity.ts'
import { Comment } from '../features/review/comment.entity.ts'
import { Decision } from '../features/review/decision.entity.ts'
import { KnownFailure } from '../features/review/known-failure.entity.ts'
import { ReviewRequest } from '../features/review/review-request.entity.ts'
import { LibraryPiece } from '../features/sets/library-piece.entity.ts'
import { TemplateSet } from '../features/sets/template-set.entity.ts'
import { Invitation } from '../features/teams/invitation.entity.ts'
import { Membership } from '../features/teams/membership.entity.ts'
import { Team } from '../features/teams/team.entity.ts'
import { ApiToken } from '../features/tokens/api-token.entity.ts'
import { AuditEntry } from '../features/upkeep/audit-entry.entity.ts'
import { PaperReading } from '../features/upkeep/paper-reading.entity.ts'
import { Throttle } from '../features/upkeep/throttle.entity.ts'
import { BranchState } from '../features/versions/branch-state.entity.ts'
import { Recheck } from '../features/versions/recheck.entity.ts'
import { SourceText } from '../features/versions/source-text.entity.ts'
import { VersionComparison } from '../features/versions/version-comparison.entity.ts'
import { VersionContent } from '../features/versions/version-content.entity.ts'
import { Version } from '../features/versions/version.entity.ts'

/** Every table. */
export const entities = [
  AccountLink,
  ApiToken,
  AuditEntry,
  BranchState,
  Build,
  BuildInvitation,
  BuildPhoto,
  Comment,
  Decision,
  Delivery,
  Erratum,
  Invitation,
  KnownFailure,
  LibraryPiece,
  Membership,
  Notice,
  NoticeChoice,
  NumberTick,
  PaperReading,
  Person,
  Publication,
  PublishedFile,
  Push,
  PushVersion,
  Recheck,
  ReviewRequest,
  Session,
  SourceText,
  Team,
  TemplateSet,
  Throttle,
  Version,
  VersionComparison,
  VersionContent,
  Webhook,
]
