using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace JointPlanner.Archive.Sqlite.Migrations
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
                type: "INTEGER",
                nullable: false,
                defaultValue: false);

            migrationBuilder.CreateTable(
                name: "PasswordLinks",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    PersonId = table.Column<Guid>(type: "TEXT", nullable: false),
                    TokenHash = table.Column<string>(type: "TEXT", nullable: false),
                    MadeById = table.Column<Guid>(type: "TEXT", nullable: true),
                    MadeAt = table.Column<long>(type: "INTEGER", nullable: false),
                    ExpiresAt = table.Column<long>(type: "INTEGER", nullable: false),
                    ClosedAt = table.Column<long>(type: "INTEGER", nullable: true),
                    Version = table.Column<long>(type: "INTEGER", nullable: false)
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
