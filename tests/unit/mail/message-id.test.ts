import { describe, expect, it } from 'vitest';
import { messageIdOf } from '@/lib/mail/message-id';

describe('a Message-ID', () => {
  it.each([
    ['Carryover <carryover@example.org>', '<m-1@example.org>'],
    ['carryover@mail.example.org', '<m-1@mail.example.org>'],
    ['"Post @ Carryover" <post@example.org>', '<m-1@example.org>'],
    ['nobody in particular', '<m-1@carryover.invalid>'],
  ])('from the sender %s is %s', (from, expected) => expect(messageIdOf('m-1', from)).toBe(expected));
});
