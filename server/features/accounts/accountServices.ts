import type { Logger } from 'pino'
import type { AppConfig } from '../../config/appConfig.ts'
import type { Clock } from '../../config/clock.ts'
import type { Database } from '../../db/client.ts'
import type { MailSender } from '../../mail/mailSender.ts'
import type { EventHub } from '../events/eventHub.ts'
import { createInvitationService } from './invitationService.ts'
import { createLinkTokens } from './linkTokens.ts'
import type { PasswordHasher } from './passwordHasher.ts'
import { createPasswordService } from './passwordService.ts'
import { createPersonService } from './personService.ts'
import type { SessionService } from './sessionService.ts'
import { createSignInGuard } from './signInGuard.ts'
import { createSignInService } from './signInService.ts'

interface AccountParts {
  db: Database
  clock: Clock
  config: AppConfig
  mail: MailSender
  logger: Logger
  hasher: PasswordHasher
  events: EventHub
  sessions: SessionService
}

export type AccountServices = ReturnType<typeof createAccountServices>

/** What the feature is made of: people, signing in, passwords, invitations. */
export function createAccountServices(parts: AccountParts) {
  const links = createLinkTokens({ secret: parts.config.sessionSecret, clock: parts.clock })
  const guard = createSignInGuard(parts)
  return {
    people: createPersonService(parts),
    signIns: createSignInService({ ...parts, guard }),
    passwords: createPasswordService({ ...parts, links, guard }),
    invitations: createInvitationService({ ...parts, links }),
  }
}
