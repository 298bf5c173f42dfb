import { expect, test } from './fixture';

test.describe('the window stays what it is', { tag: '@main-process' }, () => {
  test('it goes to no other page', async ({ sharedDesk: desk }) => {
    const { page } = desk;
    const before = page.url();
    for (const address of ['https://foreign.example/', 'http://127.0.0.1:9/', 'file:///etc/hostname']) {
      await page.evaluate((target) => {
        const link = document.createElement('a');
        link.href = target;
        document.body.append(link);
        link.click();
      }, address);
      // An answer from main proves that the attempt, which came first, is over.
      expect(await page.evaluate(() => window.desk.hostFacts().then(({ ok }) => ok))).toBe(true);
      expect(page.url()).toBe(before);
    }
    expect(desk.requests.filter((url) => /foreign\.example|127\.0\.0\.1:9|^file:/.test(url))).toEqual([]);
  });

  test('it opens no other window', async ({ sharedDesk: desk }) => {
    const opened = await desk.page.evaluate(() => {
      const link = document.createElement('a');
      link.href = 'https://foreign.example/';
      link.target = '_blank';
      document.body.append(link);
      link.click();
      return window.open('https://foreign.example/') === null;
    });
    expect(opened).toBe(true);
    const count = await desk.evaluateInMain?.(({ BrowserWindow }) => BrowserWindow.getAllWindows().length);
    expect(count).toBe(1);
    expect(desk.requests.filter((url) => url.includes('foreign.example'))).toEqual([]);
  });

  test('closing with unsaved work asks first; cancelled, it goes on; given up, it closes', async ({ desk }) => {
    const { page, evaluateInMain } = desk;
    const title = () => evaluateInMain?.(({ BrowserWindow }) => BrowserWindow.getAllWindows()[0]?.getTitle());
    const close = () =>
      evaluateInMain?.(({ BrowserWindow }) => {
        BrowserWindow.getAllWindows()[0]?.close();
        return BrowserWindow.getAllWindows().length;
      });
    await expect.poll(title).toMatch(/^[^*].* — Sunder$/);
    await page.getByRole('button', { name: 'Duplicate' }).first().click();
    await expect.poll(title).toMatch(/^\* .+ — Sunder$/);
    expect(await close()).toBe(1);
    const question = page.getByRole('dialog', { name: 'Save your changes?' });
    await question.getByRole('button', { name: 'Cancel' }).click();
    await expect(question).toBeHidden();
    expect(await title()).toMatch(/^\* /);
    expect(await close()).toBe(1);
    const gone = page.waitForEvent('close');
    // The window is gone before a click of the test's own could report back.
    await question
      .getByRole('button', { name: 'Don’t save' })
      .evaluate((button: HTMLElement) => void setTimeout(() => button.click()));
    await gone;
  });

  test('closing without unsaved work just closes', async ({ desk }) => {
    const gone = desk.page.waitForEvent('close');
    await desk.evaluateInMain?.(({ BrowserWindow }) => BrowserWindow.getAllWindows()[0]?.close());
    await gone;
  });
});
