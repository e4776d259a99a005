# The front end and the service are built in the SDK's image and run, without either tool, as an unprivileged user.
FROM node:20-bookworm-slim AS web
WORKDIR /source/web
COPY web/package.json web/package-lock.json web/.npmrc ./
RUN npm ci --no-audit --no-fund
COPY web/ ./
RUN npm run build -- --outDir /source/wwwroot

FROM mcr.microsoft.com/dotnet/sdk:10.0 AS build
WORKDIR /source
COPY global.json Directory.Build.props Directory.Packages.props BannedSymbols.txt .editorconfig ./
COPY src/ src/
COPY db/ db/
COPY --from=web /source/wwwroot src/PassPlanner.Service/wwwroot
RUN dotnet publish src/PassPlanner.Service -c Release -o /app -p:SkipFrontEnd=true

FROM mcr.microsoft.com/dotnet/aspnet:10.0
RUN apt-get update && apt-get install -y --no-install-recommends curl && rm -rf /var/lib/apt/lists/* \
    && mkdir /data && chown app:app /data
WORKDIR /app
COPY --from=build /app ./
USER app
ENV Data__Directory=/data \
    Urls=http://0.0.0.0:5080
EXPOSE 5080
VOLUME /data
HEALTHCHECK --interval=30s --timeout=3s --start-period=15s CMD curl -fsS http://127.0.0.1:5080/health/ready || exit 1
ENTRYPOINT ["dotnet", "PassPlanner.Service.dll"]
