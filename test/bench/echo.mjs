/** The yardstick: Express that reads JSON and sends it back, and nothing else. */
import express from 'express';

const app = express();
app.disable('x-powered-by');
app.set('etag', false);
app.use(express.json());
app.post('/echo', (request, response) => response.json(request.body));
const server = app.listen(0, '127.0.0.1', () => {
  const address = server.address();
  const port = typeof address === 'object' ? address?.port : undefined;
  console.log(JSON.stringify({ msg: 'listening', port }));
});
