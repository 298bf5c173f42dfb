import { expect, test } from './fixture';

test.describe('the window stays what it is', { tag: '@main-process' }, () => {
  test('it goes to no other page', async ({ desk }) => {
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

  test('it opens no other window', async ({ desk }) => {
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

  test('closing with unsaved work asks the page, and the page decides', async ({ desk }) => {
    const { page, evaluateInMain } = desk;
    const asked = page.evaluate(async () => {
      await window.desk.noteUnsaved(true, 'Trial');
      return new Promise<string>((resolve) => {
        window.desk.onWindowClosing(() => resolve('asked'));
        document.title = 'listening';
      });
    });
    await expect.poll(() => page.title()).toBe('listening');
    const left = await evaluateInMain?.(({ BrowserWindow }) => {
      BrowserWindow.getAllWindows()[0]?.close();
      return BrowserWindow.getAllWindows().length;
    });
    expect(await asked).toBe('asked');
    expect(left).toBe(1);
    const gone = page.waitForEvent('close');
    await page.evaluate(() => void window.desk.closeWindow());
    await gone;
  });

  test('closing without unsaved work just closes', async ({ desk }) => {
    const gone = desk.page.waitForEvent('close');
    await desk.evaluateInMain?.(({ BrowserWindow }) => BrowserWindow.getAllWindows()[0]?.close());
    await gone;
  });
});
