// Loaded into every service that a launcher starts: if the launcher is gone, killed even, the service ends in order.
process.on('disconnect', () => process.kill(process.pid, 'SIGTERM'));
// The line to the launcher must not by itself keep a service alive that has nothing left to do.
process.channel?.unref();
