using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace JointPlanner.Archive.PostgreSql.Migrations
{
    /// <inheritdoc />
    public partial class PasswordLinks : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<bool>(
                name: "Demonstration",
                table: "People",
                type: "boolean",
                nullable: false,
                defaultValue: false);

            migrationBuilder.CreateTable(
                name: "PasswordLinks",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uuid", nullable: false),
                    PersonId = table.Column<Guid>(type: "uuid", nullable: false),
                    TokenHash = table.Column<string>(type: "text", nullable: false),
                    MadeById = table.Column<Guid>(type: "uuid", nullable: true),
                    MadeAt = table.Column<DateTimeOffset>(type: "timestamp with time zone", nullable: false),
                    ExpiresAt = table.Column<DateTimeOffset>(type: "timestamp with time zone", nullable: false),
                    ClosedAt = table.Column<DateTimeOffset>(type: "timestamp with time zone", nullable: true),
                    Version = table.Column<long>(type: "bigint", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_PasswordLinks", x => x.Id);
                    table.ForeignKey(
                        name: "FK_PasswordLinks_People_MadeById",
                        column: x => x.MadeById,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_PasswordLinks_People_PersonId",
                        column: x => x.PersonId,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "IX_PasswordLinks_MadeById",
                table: "PasswordLinks",
                column: "MadeById");

            migrationBuilder.CreateIndex(
                name: "IX_PasswordLinks_PersonId",
                table: "PasswordLinks",
                column: "PersonId");

            migrationBuilder.CreateIndex(
                name: "IX_PasswordLinks_TokenHash",
                table: "PasswordLinks",
                column: "TokenHash",
                unique: true);
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "PasswordLinks");

            migrationBuilder.DropColumn(
                name: "Demonstration",
                table: "People");
        }
    }
}
