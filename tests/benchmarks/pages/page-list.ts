import { paths } from '@/lib/paths';

/** A page as it is measured: who opens it, and the selector of its main control. */
export type MeasuredPage = { name: string; as: string; path: string; control: string };

/** Finds the id that a query names in the demo. */
type FindId = (sql: string) => Promise<string>;

/** Every page of the product, on the demo's data. To add one, add a line. */
export async function pagesOf(find: FindId): Promise<MeasuredPage[]> {
  const course = await find(`select id from courses limit 1`);
  const setOf = (number: number) => find(`select id from problem_sets where number = ${number}`);
  const [released, closed, open] = [await setOf(1), await setOf(2), await setOf(3)];
  const waiting = await find(
    `select id from queue_items where problem_set_id = '${closed}' and state = 'waiting' order by created_at limit 1`,
  );
  const template = await find(`select id from templates order by name limit 1`);
  const noor = await find(`select id from users where email = 'noor.applewick@wrenfield.example'`);
  const member = await find(`select id from memberships where user_id = '${noor}'`);
  const button = 'main button';
  const row = 'main table a, main table button';
  return [
    { name: 'sign in', as: 'nobody', path: paths.signIn(), control: 'main button[type=submit]' },
    { name: 'my work', as: 'student', path: paths.work(), control: 'main a' },
    {
      name: 'a set, answering',
      as: 'student',
      path: paths.workSet(open),
      control: 'main input.control, main textarea',
    },
    { name: 'own score report', as: 'student', path: paths.workReport(released), control: 'main button, main a' },
    { name: 'try a reading', as: 'student', path: paths.reading(), control: 'main input, main textarea' },
    { name: 'account', as: 'student', path: paths.account(), control: button },
    { name: 'courses', as: 'instructor', path: paths.courses(), control: row },
    { name: 'course', as: 'instructor', path: paths.course(course), control: row },
    { name: 'roster', as: 'instructor', path: paths.roster(course), control: row },
    { name: 'one person', as: 'instructor', path: paths.rosterPerson(course, member), control: button },
    { name: 'course log', as: 'instructor', path: paths.log(course), control: 'main button, main select, main input' },
    { name: 'API tokens', as: 'instructor', path: paths.tokens(course), control: button },
    { name: 'shelf', as: 'instructor', path: paths.templates(), control: row },
    { name: 'template editor', as: 'instructor', path: paths.template(template), control: 'main input.control' },
    { name: 'set', as: 'instructor', path: paths.set(course, closed), control: 'main button, main summary' },
    { name: 'new set', as: 'instructor', path: paths.newSet(course), control: 'main input.control' },
    { name: 'intake', as: 'ta', path: paths.intakes(course, closed), control: 'main button[type=submit]' },
    { name: 'queue', as: 'ta', path: paths.queue(course, closed), control: 'main button[type=submit]' },
    { name: 'desk', as: 'ta', path: paths.desk(course, closed, waiting), control: 'main button[type=submit]' },
    { name: 'check bench', as: 'ta', path: paths.bench(), control: 'main button[type=submit]' },
    { name: 'release', as: 'head-ta', path: paths.release(course, closed), control: button },
    { name: 'deliveries', as: 'head-ta', path: paths.deliveries(course, released), control: row },
    { name: 'a report', as: 'head-ta', path: paths.reportOf(course, released, noor), control: 'header a' },
    {
      name: 'consistency',
      as: 'head-ta',
      path: paths.consistency(course, released),
      control: 'main a, main button, main summary, header a',
    },
    { name: 'accounts', as: 'administrator', path: paths.adminAccounts(), control: row },
    { name: 'mail', as: 'administrator', path: paths.adminMail(), control: 'main button, main a, header a' },
    { name: 'log', as: 'administrator', path: paths.adminLog(), control: 'main button, main select, main input' },
  ];
}
