process.stdout.write('winterledger\n');
