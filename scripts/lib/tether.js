/**
 * Loaded into a server before its own code: when the script that started it is gone, however that
 * came about, the server stops too.
 */
process.on('disconnect', () => process.kill(process.pid, 'SIGTERM'));
process.channel?.unref();
