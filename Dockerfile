# The service in a container: built in the first stage, run from the second without sources or development packages.
#   docker build -t field-length-service . && docker run --rm --read-only -p 127.0.0.1:3000:3000 field-length-service

# The one place that names the base: a long-term support version of Node.js, by its exact tag.
ARG NODE_IMAGE=node:24.21.0-bookworm-slim

FROM ${NODE_IMAGE} AS build
WORKDIR /service
COPY package.json package-lock.json ./
RUN npm ci --ignore-scripts
COPY tsconfig.json ./
COPY src ./src
# a checkout may keep its files from others, and the service runs as another user
RUN npm run build && npm prune --omit=dev --ignore-scripts && chmod -R a+rX dist node_modules package.json

FROM ${NODE_IMAGE}
WORKDIR /service
COPY --from=build /service/package.json ./
COPY --from=build /service/node_modules ./node_modules
COPY --from=build /service/dist ./dist
# The service by itself listens to its own machine alone. Here it listens to the container's whole network, on purpose:
# nothing reaches it there but by a port that someone publishes. It asks nobody who they are; see docker/compose.yaml.
ENV HOST=0.0.0.0 PORT=3000
EXPOSE 3000
# no such user is in the base and root owns every file, so the service can change nothing it runs from
USER 10001:10001
HEALTHCHECK --interval=30s --timeout=5s --start-period=20s --retries=3 CMD ["node", "dist/health-check.js"]
CMD ["node", "dist/main.js"]
