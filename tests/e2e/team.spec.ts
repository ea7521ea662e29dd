import { randomUUID } from 'node:crypto'

import type { Page } from '@playwright/test'

import { BRAND, LINE, signIn, signOut } from './support/accounts'
import { letterTo, linkIn } from './support/letters'
import { overflowOf, SCRIPT_BAR, scriptBytesOf, violationsOf } from './support/page-checks'
import { expect, test } from './support/test'

const TEAM = `/${BRAND}/team`
const PASSWORD = 'lanterns under the larches'
const SUBJECT = 'Marged Orrelby invites you to Teasel & Tarn'
const anAddress = () => `guest-${randomUUID()}@people.example`

async function invite(page: Page, email: string, role = 'Designer') {
  await page.goto(TEAM)
  await page.getByLabel('E-mail addresses').fill(email)
  await page.getByLabel('Role', { exact: true }).selectOption(role)
  await page.getByRole('button', { name: 'Send invitations' }).click()
  await expect(page.getByText(`Invited: ${email}.`)).toBeVisible()
}

async function joinAsNew(guest: Page, address: string, name: string) {
  await guest.goto(address)
  await guest.getByLabel('Your name').fill(name)
  await guest.getByLabel('Password', { exact: true }).fill(PASSWORD)
  await guest.getByRole('button', { name: 'Make account and join Teasel & Tarn' }).click()
  await expect(guest).toHaveURL(new RegExp(`/${BRAND}$`))
}

test('a guest is invited by letter, makes an account, joins, changes role, and is removed', async ({
  page,
  browser,
  request,
}) => {
  test.setTimeout(120_000)
  const email = anAddress()
  await signIn(page, 'owner')
  await page.getByRole('navigation', { name: 'Teasel & Tarn' }).getByText('Team').click()
  await expect(page.getByRole('heading', { level: 1, name: 'Team' })).toBeVisible()

  await page.getByLabel('E-mail addresses').fill('not-an-address')
  await page.getByRole('button', { name: 'Send invitations' }).click()
  await expect(page.getByText('“not-an-address” is no e-mail address')).toBeVisible()
  await invite(page, email)
  const open = page.getByRole('list', { name: 'Open invitations' })
  await expect(open.getByText(email, { exact: true })).toBeVisible()

  const letter = await letterTo(email, SUBJECT)
  expect(letter.text).toContain('as a designer')
  expect(letter.html).toContain('Open the invitation')
  const invitation = linkIn(letter)
  expect(new URL(invitation).origin).toBe(process.env.APP_ORIGIN)

  const other = await browser.newContext()
  const guest = await other.newPage()
  const problems: string[] = []
  guest.on('pageerror', (error) => problems.push(error.message))
  await guest.goto(invitation)
  await expect(guest.getByRole('heading', { level: 1, name: 'Join Teasel & Tarn' })).toBeVisible()
  await expect(guest.getByLabel('E-mail')).toHaveValue(email)
  expect(await violationsOf(guest)).toEqual([])
  expect(await scriptBytesOf(guest, invitation)).toBeLessThanOrEqual(SCRIPT_BAR)
  await guest.setViewportSize({ width: 320, height: 640 })
  expect(await overflowOf(guest)).toBeLessThanOrEqual(0)
  await guest.setViewportSize({ width: 1280, height: 900 })

  await guest.getByLabel('Your name').fill('Wilf Tansy')
  await guest.getByLabel('Password', { exact: true }).fill('short')
  await guest.getByRole('button', { name: 'Make account and join' }).click()
  await expect(guest.getByText('Use at least 12 characters')).toBeVisible()
  await joinAsNew(guest, invitation, 'Wilf Tansy')
  await guest.goto(`${LINE}/photographs`)
  await expect(guest.getByRole('heading', { level: 1 })).toContainText('Photographs')
  await guest.goto(TEAM)
  await expect(guest.getByText('Wilf Tansy (you)')).toBeVisible()
  await expect(guest.getByRole('button', { name: 'Send invitations' })).toHaveCount(0)
  await expect(guest.locator('main')).not.toContainText('@')
  // The link they came by now leads to the brand; to whoever is not of it, it is gone.
  await guest.goto(invitation)
  await expect(guest).toHaveURL(new RegExp(`/${BRAND}$`))
  expect((await request.get(invitation)).status()).toBe(404)

  await page.goto(TEAM)
  await expect(page.getByRole('heading', { name: 'Open invitations' })).toBeVisible()
  await expect(page.getByText(email, { exact: true })).toHaveCount(1)
  await page.getByRole('button', { name: 'Change role of Wilf Tansy' }).click()
  await page.getByRole('dialog').getByLabel('Dye house').check()
  await page.getByRole('dialog').getByRole('button', { name: 'Change role' }).click()
  await expect(page.getByText('Wilf Tansy is its dye house now.')).toBeVisible()
  expect((await guest.goto(`${LINE}/photographs`))!.status()).toBe(403)
  const told = await letterTo(email, 'Your role at Teasel & Tarn has changed')
  expect(told.text).toContain('you were a designer and are now its dye house')

  await page.getByRole('button', { name: 'Remove Wilf Tansy' }).click()
  const asked = page.getByRole('alertdialog', { name: 'Remove Wilf Tansy?' })
  await expect(asked.getByRole('button', { name: 'Keep member' })).toBeFocused()
  await asked.getByRole('button', { name: 'Remove member' }).click()
  await expect(page.getByRole('list', { name: 'Members' }).getByText('Wilf Tansy')).toHaveCount(0)
  await expect(page.getByRole('list', { name: 'Members' })).toBeFocused()
  expect((await guest.goto(`${LINE}/shades`))!.status()).toBe(404)
  await letterTo(email, 'You are no longer part of Teasel & Tarn')
  await guest.goto('/')
  await expect(guest.getByRole('heading', { name: 'You belong to no brand yet' })).toBeVisible()
  expect(problems).toEqual([])
  await other.close()
})

test('an account of another brand joins with itself, then leaves again', async ({
  page,
  browser,
}) => {
  test.setTimeout(120_000)
  const email = 'owner@quern.example'
  await signIn(page, 'owner')
  await invite(page, email, 'Marketer')
  const invitation = linkIn(await letterTo(email, SUBJECT))

  // Whoever is signed in as somebody else is told, and can come back.
  await page.goto(invitation)
  await expect(page.getByText('You are signed in as owner@teasel.example')).toBeVisible()
  expect(await violationsOf(page)).toEqual([])
  await page.getByRole('button', { name: 'Sign out and come back here' }).click()
  await expect(page.getByText(`${email} has an account.`)).toBeVisible()
  await expect(page).toHaveURL(new RegExp(`${invitation}$`))
  expect(await violationsOf(page)).toEqual([])
  await page.getByRole('link', { name: 'Sign in' }).click()
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password', { exact: true }).fill('millstones-turn-slowly')
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.getByRole('button', { name: 'Join Teasel & Tarn' }).click()
  await expect(page).toHaveURL(new RegExp(`/${BRAND}$`))

  const other = await browser.newContext()
  const owner = await other.newPage()
  await signIn(owner, 'owner')
  await owner.goto(TEAM)
  await expect(owner.getByText('Marketer since', { exact: false }).nth(1)).toBeVisible()
  await other.close()

  await page.goto(TEAM)
  await page.getByRole('button', { name: 'Leave Teasel & Tarn' }).click()
  const asked = page.getByRole('alertdialog', { name: 'Leave Teasel & Tarn?' })
  await asked.getByRole('button', { name: 'Leave Teasel & Tarn' }).click()
  await expect(page).toHaveURL(/\/quern-yarn-works$/)
  expect((await page.goto(TEAM))!.status()).toBe(404)
})

test('a withdrawn invitation opens nothing, and the only owner is told why they cannot leave', async ({
  page,
}) => {
  const email = anAddress()
  await signIn(page, 'owner')
  await invite(page, email)
  const invitation = linkIn(await letterTo(email, SUBJECT))
  await page.getByRole('button', { name: `Send again to ${email}` }).click()
  await expect(page.getByText('sent less than a minute ago')).toBeVisible()
  await page.getByRole('button', { name: `Withdraw the invitation of ${email}` }).click()
  await page.getByRole('button', { name: 'Withdraw invitation' }).click()
  await expect(page.getByText(`The invitation of ${email} is withdrawn.`)).toBeVisible()
  await expect(page.getByText(email, { exact: true })).toHaveCount(0)
  await expect(page.getByText('You are the only owner of Teasel & Tarn')).toBeVisible()
  await expect(page.getByRole('button', { name: /^Leave/ })).toHaveCount(0)
  await signOut(page)
  expect((await page.goto(invitation))!.status()).toBe(404)
  await expect(
    page.getByRole('heading', { name: 'This invitation is not good any more' }),
  ).toBeVisible()
  expect(await violationsOf(page)).toEqual([])
})
