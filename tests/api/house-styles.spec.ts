import { cp, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import type { HouseStyle } from '#shared/house-style';
import { projectRoot } from '../../server/config';
import { startTestApplication, type TestApplication } from '../builders/test-application';

let templatesDirectory: string;

beforeEach(async () => {
  templatesDirectory = await mkdtemp(join(tmpdir(), 'evenhand-templates-'));
  await cp(join(projectRoot(), 'templates'), templatesDirectory, { recursive: true });
});

afterEach(async () => {
  await rm(templatesDirectory, { recursive: true });
});

function styleFile(id: string): string {
  return join(templatesDirectory, 'house-styles', id, 'house-style.json');
}

async function failureOfStart(): Promise<string> {
  return startTestApplication({ templatesDirectory }).then(
    async (application: TestApplication) => {
      await application.close();
      return 'started';
    },
    (problem: unknown) => (problem as Error).message,
  );
}

describe('house styles', () => {
  it('are listed by name for whoever is signed in', async () => {
    const application = await startTestApplication({ templatesDirectory });
    const browser = await application.signedIn(await application.addPerson());
    const styles = (await browser.get('/api/house-styles')).body as HouseStyle[];
    const names = styles.map(({ name }) => name);
    expect(names).toEqual([...names].sort((one, other) => one.localeCompare(other, 'en')));
    expect(styles.map(({ id }) => id)).toContain('open-clinical');
    await application.close();
    expect(application.bugs).toEqual([]);
  });

  it('that are no JSON stop the start with the file’s name', async () => {
    await writeFile(styleFile('open-clinical'), '{"schemaVersion": 1,');
    expect(await failureOfStart()).toContain(`${styleFile('open-clinical')} cannot be read:`);
  });

  it('with a wrong setting stop the start with the field', async () => {
    await writeFile(styleFile('open-clinical'), '{"schemaVersion": 1}');
    const message = await failureOfStart();
    expect(message).toContain(`${styleFile('open-clinical')} cannot be used:`);
    expect(message).toMatch(/is missing\.$/);
  });

  it('under another id than their folder stop the start', async () => {
    await cp(styleFile('open-clinical'), styleFile('compact-clinical'));
    expect(await failureOfStart()).toContain(
      'its id is "open-clinical", its folder "compact-clinical"',
    );
  });

  it('and letters too: an unknown fact stops the start', async () => {
    const letter = join(templatesDirectory, 'mail', 'invitation.txt');
    await writeFile(letter, 'Subject: Hello\n\nDear {nickname},\n');
    expect(await failureOfStart()).toContain(`${letter} names {nickname}; known are {name}`);
    await writeFile(letter, 'Dear {name},\n');
    expect(await failureOfStart()).toContain('must begin with "Subject: …"');
  });
});

describe('GET /api/house-styles rejects', () => {
  it('people who are not signed in', async () => {
    const application = await startTestApplication({ templatesDirectory });
    const browser = await application.browser();
    const response = await browser.get('/api/house-styles');
    expect(response.body).toMatchObject({ status: 401, code: 'signInNeeded' });
    await application.close();
  });
});
