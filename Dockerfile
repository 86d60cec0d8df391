# The service and its dashboard, built; the database is another container's.
FROM node:20-bookworm-slim

ENV NEXT_TELEMETRY_DISABLED=1
WORKDIR /groundward
RUN chown node:node /groundward && install -d -o node -g node /data
USER node

COPY --chown=node:node package.json package-lock.json .npmrc ./
COPY --chown=node:node engine/package.json engine/
COPY --chown=node:node api/package.json api/
COPY --chown=node:node web/package.json web/
RUN npm ci --include=dev --ignore-scripts

COPY --chown=node:node . .
RUN node scripts/build.mjs

ENV NODE_ENV=production HOST=0.0.0.0 PORT=4600 GROUNDWARD_DATA=/data
VOLUME /data
EXPOSE 4600
CMD ["node", "scripts/start.mjs"]
