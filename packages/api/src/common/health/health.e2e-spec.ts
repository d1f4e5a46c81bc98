import { rmSync } from 'node:fs';
import { UnitOfWork } from '../database/unit-of-work.js';
import { startTestApp } from '../../testing/start-test-app.js';

const REFUSED_MAIL = `INSERT INTO "outbox" ("id", "to", "subject", "text", "html", "createdAt", "dueAt", "attempts")
  VALUES ('m', 'x@test.example', 'A', 'B', 'C', '2026-01-01T00:00:00.000Z', '9999-01-01T00:00:00.000Z', 3)`;

describe('health', () => {
  it('is alive and ready once started', async () => {
    const test = await startTestApp();
    await test.guest.get('/health/live').expect(200, { status: 'ok' });
    await test.guest.get('/health/ready').expect(200, { status: 'ok', notes: [] });
    await test.stop();
  });

  it('tells of mails that wait, and is ready all the same', async () => {
    const test = await startTestApp({ env: { NODE_ENV: 'production', JWT_SECRET: 'x'.repeat(40) } });
    await test.app.get(UnitOfWork).runPrepared((db) => void db.run(REFUSED_MAIL));
    const { body } = await test.guest.get('/health/ready').expect(200);
    expect(body.notes).toEqual(['Mails refused so far and waiting: 1.', 'SMTP_URL is not set: mails wait.']);
    await test.stop();
  });

  it('says what is wrong as a problem, and is alive all the same', async () => {
    const test = await startTestApp();
    rmSync(test.settings.dataDir, { recursive: true });
    const { body, headers } = await test.guest.get('/health/ready').expect(503);
    expect(headers['content-type']).toContain('application/problem+json');
    expect(body).toMatchObject({ status: 503, checks: { disk: 'the data folder is gone' } });
    await test.guest.get('/health/live').expect(200);
    await test.stop();
  });
});
