import { describe, expect, it } from 'vitest';
import { invitationMail } from '@/lib/mail/invitation';
import { renderLetter } from '@/lib/mail/letter';
import { passwordResetMail } from '@/lib/mail/password-reset';

const link = 'http://127.0.0.1:3000/invitation/abc.def?x=1&y=2';

describe('letters', () => {
  it('say the same in both forms', () => {
    const mail = invitationMail({
      name: 'Ada Pell',
      invitedBy: 'Ines Marrow',
      courseNames: ['PHY 342', 'PHY 201'],
      link,
      worksUntil: 'Tuesday 15 December, 10:00 UTC',
    });
    expect(mail.subject).toBe('Your Halfmark account for PHY 342 and PHY 201');
    expect(mail.text).toContain(link);
    expect(mail.html).toContain(link.replace('&', '&amp;'));
    for (const form of [mail.text, mail.html]) {
      const flat = form.replace(/\s+/g, ' ');
      expect(flat).toContain('Welcome to Halfmark, Ada Pell');
      expect(flat).toContain('Ines Marrow has given you an account for PHY 342 and PHY 201.');
      expect(flat).toContain('until Tuesday 15 December, 10:00 UTC');
    }
  });

  it('carry no markup out of what people wrote, and no second header line', () => {
    const mail = renderLetter({
      subject: 'A\r\nBcc: all@example.org',
      title: '<img src=x onerror=alert(1)>',
      parts: [{ kind: 'link', label: '"quoted"', href: 'http://127.0.0.1/"><script>' }],
    });
    expect(mail.subject).toBe('A Bcc: all@example.org');
    expect(mail.html).not.toMatch(/<img|<script/);
    expect(mail.html).toContain('&lt;img src=x onerror=alert(1)&gt;');
  });

  it('keep plain lines short, but never break a link', () => {
    const mail = passwordResetMail({ name: 'Ada Pell', link: link + 'z'.repeat(90), worksUntil: 'noon' });
    const lines = mail.text.split('\n').filter((line) => !line.startsWith('http'));
    expect(Math.max(...lines.map((line) => line.length))).toBeLessThanOrEqual(76);
    expect(mail.text).toContain(`\n${link}${'z'.repeat(90)}\n`);
  });
});
