/**
 * Loaded before the server (`node --import`): when the program that started it is killed outright, the
 * channel to it closes, and the server takes that as its signal to end.
 */
process.channel?.unref();
process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'));
