import type { Action } from '../../../shared/access/permissions.ts'
import type { RouteName } from '../../router/routes.ts'
import type { IconName } from '../base/icons.ts'

interface Destination {
  name: RouteName
  title: string
  action: Action
  icon: IconName
}

/** What the top bar leads to, for those who may go there. */
export const DESTINATIONS: readonly Destination[] = [
  { name: 'houses', title: 'Houses', action: 'house.read', icon: 'house' },
  { name: 'price-book', title: 'Price book', action: 'price-book.read', icon: 'book' },
  { name: 'people', title: 'People', action: 'person.read', icon: 'people' },
  { name: 'outbox', title: 'Outbox', action: 'outbox.read', icon: 'mail' },
]
