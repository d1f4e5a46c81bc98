# A mailbox for trying things out: takes every mail on 1025 and shows it on 8025. Never for production.
FROM node:20-bookworm-slim
WORKDIR /catcher
RUN npm init -y >/dev/null && npm install --no-audit --no-fund --ignore-scripts smtp-server@3.21.6 mailparser@3.14.2
COPY packages/api/scripts/mail-catcher.mjs ./
USER node
EXPOSE 1025 8025
CMD ["node", "mail-catcher.mjs"]
