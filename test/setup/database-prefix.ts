/** Names begin like this, so that one grant covers every database that a test makes. */
export const databasePrefix = 'weighhouse_test_';
