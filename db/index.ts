export type { Knex } from "knex";
export { closeDatabase, db } from "./connection";
export { type StorageFault, storageFault } from "./faults";
export { transaction } from "./transaction";
