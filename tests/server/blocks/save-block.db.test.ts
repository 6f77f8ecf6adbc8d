import { beforeEach, expect, test } from 'vitest';
import type { BlockInput } from '@/lib/schemas/block';
import { saveBlock } from '@/lib/server/blocks/save-block';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildUser } from '../../builders/build-user';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

const held = useTestDatabase();
const save = (row: Omit<BlockInput, 'campId'>) =>
  saveBlock({ campId: 'cmp_1', ...row }, { actor: staff('organiser'), now: NOW });
const times = () => loadProgramme('cmp_1')?.blocks.map(({ starts, ends }) => `${starts}–${ends}`);

beforeEach(() => {
  buildCamp(held.db);
  buildUser(held.db, { id: 'usr_organiser', roles: ['organiser'] });
});

test('a start that another time of day has is refused by name: the grid would hide one of the two', () => {
  for (const ends of ['21:30', '22:00'])
    expect(save({ starts: '20:00', ends, label: '' })).toMatchObject({
      error: {
        fields: {
          starts: ['From: 20:00 is taken by Evening, 20:00–21:30. Give another start, or change that one.'],
        },
      },
    });
  expect(save({ blockId: 'blk_1a', starts: '11:00', ends: '12:00', label: '' }).ok).toBe(false);
  expect(times()).toEqual(['09:30–10:45', '11:00–12:15', '20:00–21:30']);
});

test('a time keeps its own start, may lie within another, and is not found in a foreign camp', () => {
  expect(save({ blockId: 'blk_1a', starts: '09:30', ends: '12:15', label: 'Long' }).ok).toBe(true);
  expect(save({ starts: '10:00', ends: '11:00', label: '' }).ok).toBe(true);
  expect(times()).toEqual(['09:30–12:15', '10:00–11:00', '11:00–12:15', '20:00–21:30']);
  buildCamp(held.db, { id: 'cmp_2', organisationId: 'org_2' });
  expect(save({ blockId: 'blk_2a', starts: '07:00', ends: '08:00', label: '' })).toMatchObject({
    error: { code: 'not_found' },
  });
});
