import express from 'express';

const port = Number(process.env.PORT ?? 4600);

const app = express();
app.get('/api/health', (_request, response) => {
  response.json({ status: 'serving' });
});

const server = app.listen(port, (problem) => {
  if (problem) throw problem;
  console.log(`Evenhand is at http://localhost:${String(port)}`);
});

process.once('SIGTERM', () => server.close());
process.once('SIGINT', () => server.close());
