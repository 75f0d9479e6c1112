import { closeDatabase, db } from "../db";
import { migrate } from "../db/migrate";
import { demoSignIns, seedDemo } from "../db/seeds";
import { closeEvaluators } from "../lib/evaluator";

/** Enters the demo people and calculations into the database of the settings; safe to repeat. */
try {
  await migrate(db());
  await seedDemo();
  console.log("Demo accounts, all invented:");
  for (const { name, email, password } of demoSignIns)
    console.log(`  ${name}: ${email}, password “${password}”`);
} finally {
  await closeEvaluators();
  await closeDatabase();
}
