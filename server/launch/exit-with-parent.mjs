// Loaded into the web server ahead of it: when the launcher is gone, killed even, the server stops as well.
if (process.channel) {
  process.on('disconnect', () => {
    process.kill(process.pid, 'SIGTERM');
    setTimeout(() => process.exit(1), 8_000).unref();
  });
  process.channel.unref();
}
