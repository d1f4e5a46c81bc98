import { AuditTrailEntity } from '../common/audit/audit-trail.entity.js';
import { IdempotencyKeyEntity } from '../common/idempotency/idempotency-key.entity.js';
import { OutboxEntity } from '../common/mail/outbox.entity.js';
import { MailTokenEntity } from '../features/accounts/mail-token.entity.js';
import { RefreshTokenEntity } from '../features/accounts/refresh-token.entity.js';
import { SessionEntity } from '../features/accounts/session.entity.js';
import { SignUpEntity } from '../features/accounts/sign-up.entity.js';
import { UserEntity } from '../features/accounts/user.entity.js';
import { BuildCrewEntity } from '../features/builds/build-crew.entity.js';
import { BuildEntity } from '../features/builds/build.entity.js';
import { EntryEntity } from '../features/builds/entry.entity.js';
import { OpenItemEntity } from '../features/builds/open-item.entity.js';
import { StepProgressEntity } from '../features/builds/step-progress.entity.js';
import { ChapterEntity } from '../features/chapters/chapter.entity.js';
import { MembershipEntity } from '../features/chapters/membership.entity.js';
import { EndorsementEntity } from '../features/endorsements/endorsement.entity.js';
import { FixEntity } from '../features/fixes/fix.entity.js';
import { ObjectionEntity } from '../features/fixes/objection.entity.js';
import { HoleLineEntity } from '../features/kits/hole-line.entity.js';
import { KitChapterEntity } from '../features/kits/kit-chapter.entity.js';
import { KitEntity } from '../features/kits/kit.entity.js';
import { PartEntity } from '../features/kits/part.entity.js';
import { SectionEntity } from '../features/kits/section.entity.js';
import { StepEntity } from '../features/kits/step.entity.js';
import { NoticeEntity } from '../features/notices/notice.entity.js';
import { PhotoUseEntity } from '../features/photos/photo-use.entity.js';
import { PhotoEntity } from '../features/photos/photo.entity.js';
import { CompletionEntity } from '../features/questions/completion.entity.js';
import { QuestionEventEntity } from '../features/questions/question-event.entity.js';
import { QuestionNumberEntity } from '../features/questions/question-number.entity.js';
import { QuestionSeenEntity } from '../features/questions/question-seen.entity.js';
import { QuestionEntity } from '../features/questions/question.entity.js';
import { ReferralEntity } from '../features/questions/referral.entity.js';
import { SearchDocEntity } from '../features/search/search-doc.entity.js';

/** Every table there is; the drift spec holds them against the migrations. */
export const entities = [
  AuditTrailEntity,
  IdempotencyKeyEntity,
  OutboxEntity,
  MailTokenEntity,
  RefreshTokenEntity,
  SessionEntity,
  SignUpEntity,
  UserEntity,
  BuildCrewEntity,
  BuildEntity,
  EntryEntity,
  OpenItemEntity,
  StepProgressEntity,
  ChapterEntity,
  MembershipEntity,
  EndorsementEntity,
  FixEntity,
  ObjectionEntity,
  HoleLineEntity,
  KitChapterEntity,
  KitEntity,
  PartEntity,
  SectionEntity,
  StepEntity,
  NoticeEntity,
  PhotoUseEntity,
  PhotoEntity,
  CompletionEntity,
  QuestionEventEntity,
  QuestionNumberEntity,
  QuestionSeenEntity,
  QuestionEntity,
  ReferralEntity,
  SearchDocEntity,
];
