import accounts from '../demo-accounts.json'
import type { DemoAccount } from './types'

/** Who can sign in to the demo. */
export const demoAccounts = accounts as DemoAccount[]
