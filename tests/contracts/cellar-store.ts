import { describe } from 'vitest';
import { testDue } from './cellar-store/due.ts';
import { testEntryQueries } from './cellar-store/entry-queries.ts';
import { testKeeping } from './cellar-store/keeping.ts';
import { testLog } from './cellar-store/log.ts';
import type { CreateStore } from './cellar-store/notes.ts';
import { testMailbox } from './cellar-store/mailbox.ts';
import { testPeople } from './cellar-store/people.ts';
import { testProjection } from './cellar-store/projection.ts';
import { testStock } from './cellar-store/stock.ts';
import { testTurns } from './cellar-store/turns.ts';

/** What every store of cellars has to do; each implementation runs it, with so many random logs. */
export function testCellarStore(name: string, create: CreateStore, { anyLogs }: { anyLogs: number }): void {
  describe(`${name} as a store of cellars`, () => {
    describe('keeps a log', () => {
      testLog(create);
    });
    describe('finds entries', () => {
      testEntryQueries(create);
    });
    describe('does turns', () => {
      testTurns(create);
    });
    describe('keeps texts', () => {
      testKeeping(create);
    });
    describe('knows people', () => {
      testPeople(create);
    });
    describe('hands out due things', () => {
      testDue(create);
    });
    describe('keeps what arrives and what is to be sent', () => {
      testMailbox(create);
    });
    describe('derives vessels from the log', () => {
      testProjection(create, anyLogs);
    });
    describe('derives the chemical store from the log', () => {
      testStock(create, anyLogs);
    });
  });
}
