import { CreateAccounts1767312000000 } from './1767312000000-create-accounts.js';
import { CreateKitsAndQuestions1767312100000 } from './1767312100000-create-kits-and-questions.js';
import { CreateSignUps1767312200000 } from './1767312200000-create-sign-ups.js';

/** In the order in which they run. */
export const migrations = [
  CreateAccounts1767312000000,
  CreateKitsAndQuestions1767312100000,
  CreateSignUps1767312200000,
];
