FROM node:24-bookworm-slim AS build
WORKDIR /build
COPY package.json package-lock.json .npmrc ./
COPY sdk/package.json sdk/
RUN npm ci
COPY . .
# What is pruned leaves the folders of its scopes behind.
RUN npm run build && npm prune --omit=dev --workspaces=false && find node_modules -type d -empty -delete

FROM node:24-bookworm-slim
ENV NODE_ENV=production RODSET_HOST=0.0.0.0 RODSET_PORT=8080 RODSET_ADMIN_PORT=8081
WORKDIR /rodset
COPY --from=build --chown=root:root /build/package.json ./
COPY --from=build --chown=root:root /build/node_modules node_modules
COPY --from=build --chown=root:root /build/openapi/openapi.json openapi/
COPY --from=build --chown=root:root /build/dist/services dist/services
# By number, so that an orchestrator can see that it is not root.
USER 1000:1000
EXPOSE 8080 8081
HEALTHCHECK --interval=10s --timeout=3s --start-period=5s \
  CMD ["node", "-e", "fetch('http://127.0.0.1:' + process.env.RODSET_ADMIN_PORT + '/livez').then((answer) => process.exit(answer.ok ? 0 : 1), () => process.exit(1))"]
CMD ["node", "dist/services/http/main.js"]
