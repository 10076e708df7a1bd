import { seedWhenEmpty } from './seed-when-empty';

await seedWhenEmpty();
