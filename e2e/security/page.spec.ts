import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { expect, expectQuiet, test, watch } from '../workbench';

/** Rows of the safety list that Chromium itself can show, with the built page. */
test.describe('security of the page in Chromium', () => {
  test('ordinary use breaks no content policy, writes no console error and asks nothing from elsewhere', async ({
    workbench: page,
  }) => {
    await page.getByRole('heading', { level: 1 }).first().waitFor();
    const places = page.getByRole('navigation').first().locator('a, button');
    const count = await places.count();
    expect(count).toBeGreaterThan(1);
    for (let i = 0; i < count; i++) {
      await places.nth(i).click();
      await page.getByRole('heading').first().waitFor();
    }
  });

  test('an inline script, eval, a foreign picture and a foreign request are each blocked and reported', async ({
    context,
    page,
    site,
  }) => {
    const seen = watch(context, site.server.origin);
    await page.goto(site.server.windowAddress());
    await page.getByRole('heading', { level: 1 }).first().waitFor();
    expectQuiet(seen);
    let arrived = 0;
    const elsewhere = createServer((_, response) => {
      arrived += 1;
      response.end();
    });
    await new Promise<void>((ready) => elsewhere.listen(0, '127.0.0.1', ready));
    const foreignOrigin = `http://127.0.0.1:${(elsewhere.address() as AddressInfo).port}`;
    const outcome = await page.evaluate(async (foreignOrigin) => {
      const inline = document.createElement('script');
      inline.textContent = 'window.ranInline = true';
      document.head.append(inline);
      const foreign = document.createElement('script');
      foreign.src = `${foreignOrigin}/x.js`;
      document.head.append(foreign);
      const style = document.createElement('style');
      style.textContent = 'body{outline:9px solid red}';
      document.head.append(style);
      const picture = document.createElement('img');
      picture.src = `${foreignOrigin}/x.png`;
      document.body.append(picture);
      const frame = document.createElement('iframe');
      frame.src = `${foreignOrigin}/`;
      document.body.append(frame);
      const clickable = document.createElement('button');
      clickable.setAttribute('onclick', 'window.ranHandler = true');
      document.body.append(clickable);
      clickable.click();
      // The driver's own call is exempt from the policy; what runs later is not.
      const evaluated = await new Promise((resolve) =>
        setTimeout(() => {
          try {
            resolve((0, eval)('"ran"'));
          } catch (error) {
            resolve((error as Error).name);
          }
        }),
      );
      const fetched = await fetch(`${foreignOrigin}/`).catch((error: Error) => error.name);
      await new Promise((resolve) => setTimeout(resolve, 300));
      const ran = window as unknown as { ranInline?: true; ranHandler?: true };
      return {
        evaluated,
        fetched,
        inline: ran.ranInline,
        handler: ran.ranHandler,
        outline: getComputedStyle(document.body).outlineWidth,
      };
    }, foreignOrigin);
    expect(outcome).toMatchObject({ evaluated: 'EvalError', fetched: 'TypeError', inline: undefined });
    expect(outcome.handler).toBeUndefined();
    expect(outcome.outline).not.toBe('9px');
    const blocked = new Set(seen.violations.map((text) => text.split(' ')[0]));
    for (const directive of [
      'script-src-elem',
      'script-src-attr',
      'script-src',
      'style-src-elem',
      'img-src',
      'frame-src',
      'connect-src',
    ]) {
      expect(blocked, directive).toContain(directive);
    }
    elsewhere.close();
    expect(arrived).toBe(0);
  });

  test('the page is isolated from other origins', async ({ workbench: page }) => {
    expect(await page.evaluate(() => globalThis.crossOriginIsolated)).toBe(true);
  });

  test('no Node and no host object reaches a page that the program did not open', async ({
    workbench: page,
  }) => {
    const types = await page.evaluate(() => [
      typeof (globalThis as Record<string, unknown>).require,
      typeof (globalThis as Record<string, unknown>).process,
      typeof (globalThis as Record<string, unknown>).spinhue,
    ]);
    expect(types).toEqual(['undefined', 'undefined', 'undefined']);
  });

  test('position, camera and microphone are refused', async ({ page, site }) => {
    await page.goto(site.server.windowAddress());
    const answers = await page.evaluate(async () => {
      const position = await new Promise<string>((resolve) =>
        navigator.geolocation.getCurrentPosition(
          () => resolve('granted'),
          () => resolve('refused'),
        ),
      );
      const media = await navigator.mediaDevices
        .getUserMedia({ audio: true, video: true })
        .then(() => 'granted')
        .catch(() => 'refused');
      return { position, media };
    });
    expect(answers).toEqual({ position: 'refused', media: 'refused' });
  });

  test('rendered text is text: markup in the name of a project is shown, not run', async ({
    workbench: page,
  }) => {
    const name = '<img src=x onerror="window.pwned=1"><b>bold</b>';
    await page
      .getByRole('button', { name: /new project/i })
      .first()
      .click();
    await page.getByRole('textbox').first().fill(name);
    await page.getByRole('textbox').first().press('Enter');
    await page.getByText(name).first().waitFor();
    expect(await page.evaluate(() => (window as unknown as { pwned?: number }).pwned)).toBeUndefined();
  });

  test('a window that the program did not open works without access to the copies', async ({
    context,
    page,
    site,
  }) => {
    const seen = watch(context, site.server.origin);
    await page.goto(`${site.server.origin}/`);
    await page.getByRole('heading', { level: 1 }).first().waitFor();
    expect(await page.locator('meta[name="spinhue-loopback"]').count()).toBe(0);
    const status = await page.evaluate(() =>
      fetch('/host/mirrorStatus', {
        method: 'POST',
        headers: { 'content-type': 'application/json', 'x-spinhue': '1' },
        body: 'null',
      }).then((answer) => answer.status),
    );
    expect(status).toBe(403);
    expect(seen.violations).toEqual([]);
  });
});
