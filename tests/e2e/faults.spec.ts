import { expect, type Page, test } from '@playwright/test';
import { randomUUID } from 'node:crypto';
import { setTimeout as sleep } from 'node:timers/promises';
import postgres from 'postgres';
import { v7 } from 'uuid';
import { newWearer } from '@/components/wearers/wearer-schema';
import { smallJpeg } from '../access/small-jpeg';
import { makeWorld } from '../access/world';
import { ask, type Answered } from '../support/ask';
import { kill, killDatabase } from './support/kill';
import { mailsTo } from './support/mail';

test.describe.configure({ mode: 'serial', timeout: 120_000 });

const sql = postgres(process.env.ADMIN_DATABASE_URL ?? '', { max: 2, onnotice: () => {} });
test.afterAll(() => sql.end());

async function untilUp() {
  await expect
    .poll(
      () =>
        ask('/api/health', null).then(
          ({ status }) => status,
          () => 0,
        ),
      { timeout: 40_000 },
    )
    .toBe(200);
}

/** Sends until it is acknowledged, as the page does; null while the other side is down. */
async function untilAcknowledged(send: () => Promise<Answered>, withinMs = 60_000): Promise<Answered> {
  for (const endMs = Date.now() + withinMs; Date.now() < endMs; await sleep(100)) {
    const answered = await send().catch(() => null);
    if (answered && answered.status < 300) return answered;
  }
  throw new Error('never acknowledged');
}

const post = (path: string, session: string | null, body: BodyInit, type: string) =>
  ask(path, session, { method: 'POST', body, headers: { 'content-type': type } });

test('what was acknowledged is there after web, store and database were killed in the middle', async () => {
  const world = await makeWorld(sql);
  const { owner } = world.sessions;
  const wearerIds = Array.from({ length: 60 }, () => v7());
  const acknowledged: string[] = [];
  const killer = (async () => {
    for (const strike of [() => kill('web'), killDatabase, () => kill('web'), () => kill('store')]) {
      await sleep(1500);
      expect(strike()).toBe(true);
      await untilUp();
    }
  })();
  for (const id of wearerIds) {
    const body = JSON.stringify({ id, wearer: { ...newWearer(true), name: id } });
    const answered = await post('/api/wearers', owner, body, 'application/json').catch(() => null);
    if (answered && answered.status < 300) acknowledged.push(id);
    await sleep(150);
  }
  await killer;
  const rows = await sql<{ id: string }[]>`select id from wearers where id in ${sql(wearerIds)}`;
  expect(acknowledged.length).toBeGreaterThan(0);
  expect(acknowledged.length).toBeLessThan(wearerIds.length);
  const there = new Set(rows.map(({ id }) => id));
  expect(acknowledged.filter((id) => !there.has(id))).toEqual([]);
});

test('each photo sent through kills is there once, with its file', async () => {
  const world = await makeWorld(sql);
  const { owner } = world.sessions;
  const bytes = new Uint8Array(await smallJpeg());
  const keys = Array.from({ length: 12 }, () => randomUUID());
  const killer = (async () => {
    for (const strike of [() => kill('web'), () => kill('store'), killDatabase]) {
      await sleep(700);
      expect(strike()).toBe(true);
      await untilUp();
    }
  })();
  const ids: string[] = [];
  for (const key of keys) {
    const path = `/api/rounds/${world.roundId}/photos?key=${key}&view=back`;
    const answered = await untilAcknowledged(() => post(path, owner, bytes, 'image/jpeg'));
    ids.push((JSON.parse(answered.body) as { id: string }).id);
    await sleep(200);
  }
  await killer;
  const rows = await sql<{ id: string; uploadKey: string }[]>`
    select id, upload_key as "uploadKey" from photos where round_id = ${world.roundId} and id <> ${world.photoId}`;
  expect(rows.map(({ uploadKey }) => uploadKey).sort()).toEqual([...keys].sort());
  expect(rows.map(({ id }) => id).sort()).toEqual([...ids].sort());
  for (const { id } of rows) expect((await ask(`/api/photos/${id}/160?r=1`, owner)).status).toBe(200);
});

async function askForReset(page: Page, email: string) {
  await page.goto('/forgot');
  await page.getByLabel('E-mail address').fill(email);
  await page.getByRole('button').last().click();
  await expect(page.getByLabel('E-mail address')).toBeHidden();
}

test('each letter arrives though the worker is killed, and has one Message-ID', async ({ page }) => {
  const emails: string[] = [];
  for (let person = 0; person < 4; person += 1) {
    const id = v7();
    const email = `${id}@example.org`;
    await sql`insert into users (id, email, email_verified_at, display_name, password_hash)
      values (${id}, ${email}, now(), 'Letter', 'none')`;
    await askForReset(page, email);
    kill('worker');
    emails.push(email);
  }
  for (const email of emails) {
    await expect.poll(async () => (await mailsTo(email)).length, { timeout: 90_000 }).toBeGreaterThan(0);
    const ids = (await mailsTo(email)).map(({ messageId }) => messageId);
    expect(new Set(ids).size).toBe(1);
  }
});
