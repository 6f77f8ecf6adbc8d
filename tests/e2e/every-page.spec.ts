import { expect, test } from '@playwright/test';
import { axePage, fitsWidth } from './axe-page';
import { type DemoRole, errorsOf, openPage, signIn } from './sign-in';

const CAMP = '/organise/camps/cmp_demob';
const SELLING = '/camps/kettle-lake-harp-week';

/** Every page by who sees it. Pages behind ids that the seed makes up are found by following links. */
const PAGES: Record<DemoRole | 'visitor', string[]> = {
  visitor: [
    '/',
    SELLING,
    '/camps/kettle-lake-harp-week-last-year',
    `${SELLING}/register/who`,
    '/sign-in',
    '/sign-up',
    '/reset',
    '/verify',
    '/my',
    '/about/privacy',
    '/about/cautions',
    '/about/accessibility',
    '/nothing-here',
  ],
  attendee: ['/my', '/account'],
  organiser: [
    '/organise',
    '/organise/new',
    '/organise/organisations/org_demo',
    '/organise/organisations/org_demo/staff',
    '/organise/organisations/org_demo/details',
    '/organise/organisations/org_demo/camps/new',
    CAMP,
    `${CAMP}/details`,
    `${CAMP}/pictures`,
    `${CAMP}/tracks`,
    `${CAMP}/tracks/new`,
    `${CAMP}/tracks/trk_demob0`,
    `${CAMP}/rooms`,
    `${CAMP}/rooms/new`,
    `${CAMP}/instructors`,
    `${CAMP}/instructors/new`,
    `${CAMP}/times`,
    `${CAMP}/workshops`,
    `${CAMP}/workshops/new`,
    `${CAMP}/workshops/wsh_demob0`,
    `${CAMP}/timetable`,
    `${CAMP}/people`,
    `${CAMP}/money`,
    `${CAMP}/preview`,
    `${CAMP}/copy`,
    '/door',
  ],
  treasurer: ['/organise', `${CAMP}/people`, `${CAMP}/money`],
  instructor: ['/organise', `${CAMP}/my-meetings`],
  door: ['/door', '/door/cmp_demob'],
};

// Links to follow for pages whose address holds a made-up id.
const FOLLOW: Partial<Record<DemoRole | 'visitor', { from: string; link: RegExp }[]>> = {
  organiser: [{ from: `${CAMP}/people`, link: /\/people\/reg_[^/]+$/ }],
  attendee: [
    { from: '/my', link: /^\/my\/orders\/ord_[^/]+$/ },
    { from: '/my', link: /^\/my\/registrations\/reg_[^/]+\/packing-list$/ },
    { from: '/my', link: /^\/my\/registrations\/reg_[^/]+\/ticket$/ },
  ],
};

const LOOKS = [
  { colorScheme: 'light', width: 1440 },
  { colorScheme: 'dark', width: 1440 },
  { colorScheme: 'light', width: 390 },
  { colorScheme: 'dark', width: 390 },
] as const;

for (const role of Object.keys(PAGES) as (DemoRole | 'visitor')[])
  test(`the ${role} meets no barrier on any page, by day and by night, on a desk and on a phone`, async ({
    browser,
  }) => {
    test.setTimeout(400_000);
    const page = await openPage(browser, { permissions: [], viewport: { width: 1440, height: 900 } });
    if (role !== 'visitor') await signIn(page, role);
    const paths = [...PAGES[role]];
    for (const { from, link } of FOLLOW[role] ?? []) {
      await page.goto(from);
      const hrefs = await page
        .locator('a[href]')
        .evaluateAll((links) => links.map((a) => a.getAttribute('href') ?? ''));
      const found = hrefs.find((href) => link.test(href));
      expect(found, `a link like ${link} on ${from}`).toBeDefined();
      if (found) paths.push(found);
    }
    for (const path of paths) {
      const response = await page.goto(path);
      expect(response?.status(), path).toBe(path === '/nothing-here' ? 404 : 200);
      await expect(page.locator('h1').first(), path).toBeVisible();
      for (const { colorScheme, width } of LOOKS) {
        await page.emulateMedia({ colorScheme });
        await page.setViewportSize({ width, height: 900 });
        expect(await axePage(page), `${path} ${colorScheme} ${width}`).toEqual([]);
        expect.soft(await fitsWidth(page), `${path} fits ${width} px`).toBe(true);
      }
    }
    const expected404 = (error: string) => error.includes('/nothing-here') && error.includes('404');
    expect(errorsOf(page).filter((error) => !expected404(error))).toEqual([]);
    await page.context().close();
  });
