/** Writes pairs of rows without end, each pair in a transaction of its own, and says so once it is done. */
import { writeSync } from 'node:fs';
import Database from 'better-sqlite3';

const [file, round, synchronous] = process.argv.slice(2);
const STDOUT = 1;
const db = new Database(file);
db.pragma(`synchronous = ${synchronous}`);
const insert = db.prepare(
  "insert into audit_events (at, actor_name, action, subject, detail) values (?, 'Writer', ?, ?, '{}')",
);
const pair = db.transaction((subject) => {
  insert.run(Date.now(), 'test.first', subject);
  insert.run(Date.now(), 'test.second', subject);
});

for (let count = 0; ; count += 1) {
  pair.immediate(`${round}-${count}`);
  writeSync(STDOUT, `${round}-${count}\n`);
}
