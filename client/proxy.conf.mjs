const port = process.env.PORT ?? '4600';

export default {
  '/api': { target: `http://localhost:${port}`, secure: false },
};
