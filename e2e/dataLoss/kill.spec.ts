import { killTest } from './killTest';
import { expect, test } from '../workbench';

test('a browser killed in the middle of edits loses nothing that the screen had confirmed (sample of the long run)', async ({
  site,
}) => {
  test.setTimeout(240_000);
  // The page was built for this fixture.
  expect(site.server.port).toBeGreaterThan(0);
  const report = await killTest(4, 7);
  expect(report.faults).toEqual([]);
  expect(report.confirmed).toBeGreaterThan(0);
});
